import mariadb, { type Connection } from "mariadb";
import { createSchema } from "../../scripts/database/create-schema";
import { joinTestServer } from "../../scripts/test/test-server";
import { bestTimeEach, bestTimeOf } from "./support/best-time";
import { demoNetting, expectSameNet } from "./support/demo-netting";
import { report } from "./support/figure";

/**
 * The netting of ten S2 by the core against SQL in the application's own database, level by level: tables in memory, keys
 * that serve the joins, whole numbers, the lines sorted by their parents' level, and two statements a level.
 */
const { kit, parts, lines, levels, pass } = demoNetting();
const levelOf = new Map(parts.map(({ part, level }) => [part, level]));
const server = await joinTestServer();
try {
  const schema = server.schemaName("bench");
  const { DATABASE_MIGRATE_URL } = await createSchema(server.database, schema);
  const { hostname: host, port, username: user, password } = new URL(DATABASE_MIGRATE_URL);
  const connection = await mariadb.createConnection({
    host,
    port: Number(port),
    user,
    password,
    database: schema,
    allowPublicKeyRetrieval: true,
    multipleStatements: true,
    bigIntAsNumber: true,
  });
  try {
    await fillTables(connection);
    const statements = netStatements();
    await connection.query(statements);
    const rows: { part: number; net: number }[] = await connection.query("SELECT part, net FROM need");
    expectSameNet("SQL", new Map(rows.map(({ part, net }) => [part, Number(net)])), pass.run(10).net);
    const inSql = await bestTimeOf(20, () => connection.query(statements));
    const inCore = bestTimeEach(100, 20, (run) => pass.run(9 + (run % 2)));
    report([
      {
        name: "S2 at 10 kits: the same level by level in SQL",
        value: inSql,
        unit: "ms",
        note: `${levels + 1} levels`,
      },
      {
        name: "S2 at 10 kits: SQL against the core",
        value: inSql / inCore,
        unit: "times",
        target: { least: 500 },
      },
    ]);
  } finally {
    await connection.end();
  }
} finally {
  await server.leave();
}

async function fillTables(connection: Connection): Promise<void> {
  await connection.query(
    `CREATE TEMPORARY TABLE need (part INT PRIMARY KEY, level INT, is_leaf INT, stock BIGINT, yield_num BIGINT, yield_den BIGINT,
       gross BIGINT, net BIGINT, start BIGINT, KEY (level)) ENGINE=MEMORY;
     CREATE TEMPORARY TABLE line (level INT, parent INT, component INT, num BIGINT, den BIGINT, KEY USING BTREE (level, parent)) ENGINE=MEMORY;
     CREATE TEMPORARY TABLE added (component INT PRIMARY KEY, quantity BIGINT) ENGINE=MEMORY`,
  );
  await connection.batch(
    "INSERT INTO need VALUES (?, ?, ?, ?, ?, ?, 0, 0, 0)",
    parts.map(({ part, level, isLeaf, stock, yieldNum, yieldDen }) => [
      part,
      level,
      isLeaf ? 1 : 0,
      stock,
      yieldNum,
      yieldDen,
    ]),
  );
  await connection.batch(
    "INSERT INTO line VALUES (?, ?, ?, ?, ?)",
    lines.map(({ parent, component, num, den }) => [levelOf.get(parent), parent, component, num, den]),
  );
}

/** All in one round trip. */
function netStatements(): string {
  const statements = [`UPDATE need SET gross = IF(part = ${kit}, 10, 0)`];
  for (let level = 0; level <= levels; level++) {
    statements.push(
      `UPDATE need SET net = GREATEST(gross - stock, 0),
         start = IF(is_leaf, 0, (GREATEST(gross - stock, 0) * yield_num + yield_den - 1) DIV yield_den) WHERE level = ${level}`,
      "DELETE FROM added",
      `INSERT INTO added SELECT line.component, SUM((need.start * line.num + line.den - 1) DIV line.den)
         FROM line JOIN need ON need.part = line.parent WHERE line.level = ${level} AND need.start > 0 GROUP BY line.component`,
      "UPDATE need JOIN added ON added.component = need.part SET need.gross = need.gross + added.quantity",
    );
  }
  return statements.join(";\n");
}
