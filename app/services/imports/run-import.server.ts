import { createHash } from "node:crypto";
import type { Transaction } from "sequelize";
import { inTransaction } from "~/db/in-transaction.server";
import { readRows } from "~/db/read-rows.server";
import type { ImportAnswer } from "~/schemas/imports/import-answer";
import { appendAuditEvent } from "~/services/audit/append-audit-event.server";
import { readImportRows } from "~/services/imports/files/read-import-rows";
import { assertMay } from "~/services/people/assert-may.server";
import type { CurrentPerson } from "~/services/people/current-person";
import { raiseRevision } from "~/services/revision/raise-revision.server";
import type { RevisionName } from "~/services/revision/revision-name";
import type { HeaderMap } from "~/utils/csv/map-headers";
import type { ImportJob } from "./import-job";
import { presentRows } from "./present-import";
import { refuseFile, refuseRows } from "./refuse-import";

export interface ImportRequest {
  bytes: Uint8Array;
  person: CurrentPerson;
  /** Only says what would change. */
  dryRun?: boolean;
  /** Headers of the file that were matched by hand. */
  headers?: HeaderMap;
}

/** Whoever changes the same things waits here, so that what was planned is still so when it is written. */
async function lockRevisions(names: readonly RevisionName[], transaction: Transaction): Promise<void> {
  for (const name of names) {
    await readRows("SELECT value FROM revision WHERE name = :name FOR UPDATE", { name }, transaction);
  }
}

/**
 * Imports a CSV file of one kind, all or nothing, or says what it would do. The same file again changes nothing.
 * @throws AppError "forbidden"; "invalid" with errors by line and column where the file or, unless it is a dry run,
 * one of its rows is refused; "busy"
 */
export async function runImport<Row>(job: ImportJob<Row>, request: ImportRequest): Promise<ImportAnswer> {
  const { bytes, dryRun = false } = request;
  const person = assertMay(request.person, job.act);
  const read = readImportRows(bytes, job.kind, request.headers);
  if (!read.ok) throw refuseFile(read.problems);
  const fileHash = createHash("sha256").update(bytes).digest("hex");
  return inTransaction(async (transaction) => {
    if (!dryRun) await lockRevisions(job.revisions, transaction);
    const plan = await job.plan(read.rows, { transaction, person, columns: new Set(read.names), fileHash });
    const { encoding, delimiter } = read;
    const answer = { kind: job.name, dryRun, encoding, delimiter, ...presentRows(plan, read.refused) };
    if (dryRun) return answer;
    if (answer.counts.refused > 0) {
      throw refuseRows(
        answer.rows.flatMap((row) => row.errors),
        answer.counts.refused,
      );
    }
    if (!plan.changes) return answer;
    await plan.write();
    await appendAuditEvent(
      { actorId: person.id, act: job.act, subject: `file ${fileHash.slice(0, 16)}`, after: answer.counts },
      transaction,
    );
    for (const name of job.revisions) await raiseRevision(name, transaction);
    return answer;
  });
}
