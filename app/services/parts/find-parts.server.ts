import { readRows } from "~/db/read-rows.server";
import type { PresentedPart } from "~/schemas/parts/part-answer";
import type { CurrentPerson } from "~/services/people/current-person";
import { mayDo } from "~/services/people/permissions";
import { PART_COLUMNS, type PartRow, presentPart } from "./present-part";

interface PartsQuery {
  q: string;
  page: number;
  size: number;
}

export interface PartsPage {
  page: number;
  size: number;
  total: number;
  parts: PresentedPart[];
}

/** Parts in the order of their numbers: each word of the question stands in the number or the description. */
export async function findParts(query: PartsQuery, person: CurrentPerson): Promise<PartsPage> {
  const words = query.q.split(/\s+/).filter((word) => word !== "");
  const clauses = words.map(
    (_, at) => `(part.part_key LIKE :key${at} ESCAPE '!' OR part.description LIKE :word${at} ESCAPE '!')`,
  );
  const where = clauses.length > 0 ? `WHERE ${clauses.join(" AND ")}` : "";
  const replacements: Record<string, unknown> = { size: query.size, skip: (query.page - 1) * query.size };
  words.forEach((word, at) => {
    replacements[`key${at}`] = `%${escapeLike(word.normalize("NFC").toUpperCase())}%`;
    replacements[`word${at}`] = `%${escapeLike(word)}%`;
  });
  const [{ total }] = await readRows<{ total: number }>(
    `SELECT COUNT(*) AS total FROM part ${where}`,
    replacements,
  );
  const rows = await readRows<PartRow>(
    `SELECT ${PART_COLUMNS} FROM part ${where} ORDER BY part.part_key LIMIT :size OFFSET :skip`,
    replacements,
  );
  const seesCosts = mayDo(person.roles, "see-costs");
  return {
    page: query.page,
    size: query.size,
    total: Number(total),
    parts: rows.map((row) => presentPart(row, seesCosts)),
  };
}

function escapeLike(word: string): string {
  return word.replace(/[!%_]/g, "!$&");
}
