import { APPEND_ONLY_TABLES } from "~/db/append-only-tables";
import type { Migration } from "./migration";

const refusal = (table: string, act: "UPDATE" | "DELETE") =>
  `CREATE OR REPLACE TRIGGER ${table}_refuse_${act.toLowerCase()} BEFORE ${act} ON ${table} FOR EACH ROW
    SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'Rows of ${table} are never changed or deleted.'`;

export const refuseChangedFacts: Migration = {
  name: "0006-refuse-changed-facts",
  statements: APPEND_ONLY_TABLES.flatMap((table) => [refusal(table, "UPDATE"), refusal(table, "DELETE")]),
};
