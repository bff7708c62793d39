import { readRows } from "~/db/read-rows.server";
import type { FoundGroup } from "~/schemas/find/find-answer";
import { foundAddress } from "./found-address";
import type { SearchKind } from "./search-kinds";

interface FoundRow {
  name: string;
  words: string;
  part: string | null;
  /** 0 called exactly so, 1 begins so, 2 the rest. */
  place: number;
  total: number;
}

/** What was found of one kind, best first, and those of it that are called exactly so. */
export async function searchKind(
  kind: SearchKind,
  typed: string,
  most: number,
): Promise<{ group: FoundGroup; exact: string[] }> {
  const words = typed.split(/\s+/);
  const replacements: Record<string, unknown> = {
    exact: kind.keyOf(typed),
    prefix: `${escapeLike(kind.keyOf(typed))}%`,
    most,
  };
  words.forEach((word, at) => {
    replacements[`word${at}`] = `%${escapeLike(word)}%`;
  });
  const hasWord = words.map(
    (_, at) => `(${kind.searched.map((column) => `${column} LIKE :word${at} ESCAPE '!'`).join(" OR ")})`,
  );
  const rows = await readRows<FoundRow>(
    `SELECT ${kind.name} AS name, ${kind.words} AS words, ${kind.part} AS part,
      CASE WHEN ${kind.key} = :exact THEN 0 WHEN ${kind.key} LIKE :prefix ESCAPE '!' THEN 1 ELSE 2 END AS place,
      COUNT(*) OVER () AS total
    FROM ${kind.from} WHERE ${hasWord.join(" AND ")} ORDER BY place, ${kind.key} LIMIT :most`,
    replacements,
  );
  const found = rows.map(({ name, words: said, part }) => ({
    name,
    words: said,
    to: foundAddress(kind.kind, name, part),
  }));
  return {
    group: { kind: kind.kind, found, more: Number(rows[0]?.total ?? 0) - rows.length },
    exact: found.filter((_, at) => Number(rows[at].place) === 0).map(({ to }) => to),
  };
}

function escapeLike(text: string): string {
  return text.replace(/[!%_]/g, "!$&");
}
