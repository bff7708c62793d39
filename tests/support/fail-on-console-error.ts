import { format } from "node:util";
import { afterEach, beforeEach } from "vitest";

let said: string[] = [];

beforeEach(() => {
  said = [];
  console.error = (...words: unknown[]) => {
    said.push(format(...words));
  };
});

/** A test that expects a message replaces console.error by a spy of its own. */
afterEach(() => {
  if (said.length > 0) throw new Error(`The test wrote to console.error:\n${said.join("\n")}`);
});
