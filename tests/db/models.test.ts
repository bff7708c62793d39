import "~/db/associations.server";
import { describe, expect, it } from "vitest";
import { sequelize } from "~/db/client.server";
import { KitOption } from "~/db/models/parts/kit-option";
import { HalfSignIn } from "~/db/models/people/half-sign-in";
import { RecoveryCode } from "~/db/models/people/recovery-code";
import { SecondFactor } from "~/db/models/people/second-factor";
import { SetupCode } from "~/db/models/people/setup-code";
import { SignInAttempt } from "~/db/models/people/sign-in-attempt";
import { AuditEvent } from "~/db/models/system/audit-event";
import { IdempotencyKey } from "~/db/models/system/idempotency-key";
import { OutboxMail } from "~/db/models/system/outbox-mail";
import { Revision } from "~/db/models/system/revision";
import { Setting } from "~/db/models/system/setting";
import { useTestDatabase } from "../support/database";

const database = useTestDatabase();

/** Read for their effect: each one binds itself to the connection. */
const alone = [
  AuditEvent,
  IdempotencyKey,
  KitOption,
  OutboxMail,
  Revision,
  Setting,
  HalfSignIn,
  RecoveryCode,
  SecondFactor,
  SetupCode,
  SignInAttempt,
];

interface Column {
  name: string;
  nullable: "YES" | "NO";
  type: string;
}

const columnsOf = (table: unknown) =>
  database.query(
    "SELECT column_name AS name, is_nullable AS nullable, column_type AS type FROM information_schema.columns WHERE table_schema = DATABASE() AND table_name = ? ORDER BY column_name",
    [table],
  ) as Promise<unknown[]> as Promise<Column[]>;

/** `enum('clerk','planner')`, `varchar(64)`, as the database says it. */
function sqlOf(type: unknown): string {
  const { toSql, values } = type as { toSql(): string; values?: readonly string[] };
  return values ? `enum(${values.map((value) => `'${value}'`)})` : toSql.call(type);
}

describe("models", () => {
  it("stand for every table but the record of migrations", async () => {
    expect(alone.every((model) => model.sequelize === sequelize)).toBe(true);
    const tables = await database.query(
      "SELECT table_name AS name FROM information_schema.tables WHERE table_schema = DATABASE() AND table_name <> 'migration'",
    );
    const modelled = Object.values(sequelize.models).map((model) => model.tableName);
    expect(modelled.sort()).toEqual(tables.map((table) => table.name).sort());
  });

  it.each(Object.values(sequelize.models).map((model) => [model.name, model] as const))(
    "%s has the columns of its table, their texts as long and their words the same",
    async (_name, model) => {
      const columns = await columnsOf(model.tableName);
      const attributes = Object.values(model.getAttributes());
      expect(attributes.map((attribute) => attribute.field).sort()).toEqual(
        columns.map((column) => column.name).sort(),
      );
      for (const { field, type } of attributes) {
        const kind = sqlOf(type).toLowerCase().replaceAll(", ", ",");
        const column = columns.find((each) => each.name === field) as Column;
        if (/^(varchar|enum|decimal|datetime)/.test(kind) && !column.type.startsWith("char")) {
          expect({ field, type: kind }).toEqual({ field, type: column.type });
        }
      }
    },
  );
});
