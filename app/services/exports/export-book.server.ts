import { strToU8, Zip, ZipDeflate } from "fflate";
import { Transaction } from "sequelize";
import { sequelize } from "~/db/client.server";
import { exportKindNames } from "~/schemas/exports/export-kind-name";
import { assertMay } from "~/services/people/assert-may.server";
import type { CurrentPerson } from "~/services/people/current-person";
import { exportFile } from "./export-file.server";

/**
 * The whole book as one archive of CSV files, all read in one snapshot. Imported in the order of `exportKindNames` into
 * an empty program they give the same book again. People, settings and the trail of acts are part of the backup instead.
 * @throws AppError "forbidden" for all but the manager
 */
export async function exportBook(person: CurrentPerson | null): Promise<Uint8Array<ArrayBuffer>> {
  assertMay(person, "backup");
  const pieces: Uint8Array[] = [];
  const zip = new Zip((error, piece) => {
    if (error) throw error;
    pieces.push(piece);
  });
  const isolationLevel = Transaction.ISOLATION_LEVELS.REPEATABLE_READ;
  await sequelize.transaction({ isolationLevel, readOnly: true }, async (transaction) => {
    for (const kind of exportKindNames) {
      const file = new ZipDeflate(`${kind}.csv`, { level: 6 });
      // The same book gives the same archive, whenever it is asked for.
      file.mtime = "1980-01-01";
      zip.add(file);
      for await (const text of exportFile(kind, { person, transaction })) file.push(strToU8(text));
      file.push(new Uint8Array(), true);
    }
  });
  zip.end();
  return join(pieces);
}

function join(pieces: readonly Uint8Array[]): Uint8Array<ArrayBuffer> {
  const whole = new Uint8Array(pieces.reduce((sum, piece) => sum + piece.length, 0));
  let at = 0;
  for (const piece of pieces) {
    whole.set(piece, at);
    at += piece.length;
  }
  return whole;
}
