import { spawn } from "node:child_process";
import os from "node:os";
import { findProgram } from "../bootstrap/debian-packages.mjs";

/** Runs statements over the socket as the user who owns the server; they go through standard input, never the process list. */
export function askAsAdmin(socket: string, statements: string): Promise<string> {
  const client = spawn(
    findProgram("mariadb") ?? "mariadb",
    [
      "--no-defaults",
      "--protocol=socket",
      `--socket=${socket}`,
      `--user=${os.userInfo().username}`,
      "--batch",
      "--skip-column-names",
    ],
    { stdio: "pipe" },
  );
  let output = "";
  let complaint = "";
  client.stdout.setEncoding("utf8").on("data", (text) => {
    output += text;
  });
  client.stderr.setEncoding("utf8").on("data", (text) => {
    complaint += text;
  });
  client.stdin.on("error", () => {});
  client.stdin.end(statements);
  return new Promise((resolve, reject) => {
    client.on("error", reject);
    client.on("close", (code) => (code === 0 ? resolve(output.trim()) : reject(new Error(complaint.trim()))));
  });
}
