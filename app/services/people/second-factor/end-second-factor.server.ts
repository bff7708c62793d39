import { inTransaction } from "~/db/in-transaction.server";
import { appendAuditEvent } from "~/services/audit/append-audit-event.server";
import { assertPresentPassword } from "../account/assert-present-password.server";
import { ownId } from "../account/own-id";
import type { CurrentPerson } from "../current-person";
import { removeSecondFactor } from "./remove-second-factor.server";
import { spendCode } from "./spend-code.server";

interface Shown {
  password: string;
  code: string;
  address: string;
}

/**
 * Switches one's second factor off, by password and code together.
 * @throws AppError `invalid` at the field `factor-password` or `code`, `too-many`
 */
export async function endSecondFactor(
  { password, code, address }: Shown,
  person: CurrentPerson,
): Promise<void> {
  const personId = ownId(person);
  await assertPresentPassword({ personId, password, address, field: "factor-password" });
  await spendCode({ personId, code, address });
  await inTransaction(async (transaction) => {
    await removeSecondFactor(personId, transaction);
    await appendAuditEvent(
      {
        actorId: personId,
        act: "own-account",
        subject: `person ${personId}`,
        after: { secondFactor: "off" },
      },
      transaction,
    );
  });
}
