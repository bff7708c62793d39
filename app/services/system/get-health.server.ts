import { QueryTypes } from "sequelize";
import { sequelize } from "~/db/client.server";
import { ALL_MIGRATIONS } from "~/db/migrations/all-migrations";
import { Revision } from "~/db/models/system/revision";

declare global {
  /** Set by the server when it has been told to stop: it finishes what it has and takes nothing new. */
  var __cotterpinDraining: boolean | undefined;
}

interface Health {
  status: "ok" | "draining" | "unwell";
  database: "reachable" | "away";
  /** Grows with every change of structure, stock or orders. */
  revision: number | null;
  migrations: { applied: number; pending: string[] } | null;
}

/** Whether this process can do its work; anything but `ok` means that others should be asked. */
export async function getHealth(): Promise<Health> {
  try {
    const [revision, applied] = await Promise.all([sumRevisions(), appliedMigrations()]);
    const pending = ALL_MIGRATIONS.map(({ name }) => name).filter((name) => !applied.includes(name));
    const status = globalThis.__cotterpinDraining ? "draining" : pending.length > 0 ? "unwell" : "ok";
    return { status, database: "reachable", revision, migrations: { applied: applied.length, pending } };
  } catch {
    const status = globalThis.__cotterpinDraining ? "draining" : "unwell";
    return { status, database: "away", revision: null, migrations: null };
  }
}

async function sumRevisions(): Promise<number> {
  const revisions = await Revision.findAll();
  return revisions.reduce((sum, { value }) => sum + value, 0);
}

async function appliedMigrations(): Promise<string[]> {
  const rows = await sequelize.query<{ name: string }>("SELECT name FROM migration", {
    type: QueryTypes.SELECT,
  });
  return rows.map(({ name }) => name);
}
