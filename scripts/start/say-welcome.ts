import { StopSentence } from "../bootstrap/stop-sentence.mjs";
import { runTypeScript } from "./run-typescript";

/** The people of the demo firm, who all have the same password. */
const demoPeople = [
  ["planner", "Idris Fenwick", "idris@saltmarsh.example"],
  ["clerk", "Wren Adlington", "wren@saltmarsh.example"],
  ["purchaser", "Maud Okonjo", "maud@saltmarsh.example"],
  ["builder", "Tam Sorley", "tam@saltmarsh.example"],
  ["manager", "Greta Lindqvist", "greta@saltmarsh.example"],
];
const demoPassword = "saltmarsh-demo-2026";

interface Welcome {
  /** Where people find it. */
  address: string;
  /** Where it listens; the same unless a proxy stands before it. */
  local: string;
  demo: boolean;
  env: NodeJS.ProcessEnv;
}

/** Says where the application is and who may sign in, or the code for the first visitor. */
export async function sayWelcome({ address, local, demo, env }: Welcome): Promise<void> {
  const lines = ["", `Cotterpin is at ${address}${address === local ? "" : `, and listens at ${local}`}`, ""];
  if (demo) lines.push(...demoLines());
  else lines.push(...(await setUpLines(address, env)));
  console.log([...lines, "Ctrl-C stops it.", ""].join("\n"));
}

function demoLines(): string[] {
  const people = demoPeople.map(([role, name, email]) => `  ${role.padEnd(10)} ${name.padEnd(16)} ${email}`);
  return [`People of the demo firm, all with the password ${demoPassword}:`, ...people, ""];
}

/** Nothing once there is a manager. */
async function setUpLines(address: string, env: NodeJS.ProcessEnv): Promise<string[]> {
  const { code, output, standardOutput } = await runTypeScript("scripts/setup-code.ts", env);
  if (code !== 0) throw new StopSentence(`The set-up code could not be made: ${output.trim()}`);
  const setUpCode = standardOutput.trim();
  return setUpCode ? [`Set up the manager at ${address}/set-up with the one-time code ${setUpCode}`, ""] : [];
}
