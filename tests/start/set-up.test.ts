import { mkdirSync, writeFileSync } from "node:fs";
import path from "node:path";
import { expect, test } from "vitest";
import { checkNodeVersion } from "../../scripts/bootstrap/check-node-version.mjs";
import { installDebianPackages } from "../../scripts/bootstrap/debian-packages.mjs";
import { nodePackagesAreThere } from "../../scripts/bootstrap/node-packages.mjs";
import { withCrash } from "../../scripts/test/tally";
import { temporaryFolder } from "./temporary-folder";

test("an old Node.js is one sentence", () => {
  expect(() => checkNodeVersion("20.11.9")).toThrow(
    "Cotterpin needs Node.js 20.12 or newer, and this is 20.11.9",
  );
  expect(() => checkNodeVersion("18.99.0")).toThrow("20.12");
  expect(() => checkNodeVersion("20.12.0")).not.toThrow();
  expect(() => checkNodeVersion("22.1.0")).not.toThrow();
});

test("missing Debian packages are one sentence for who may not install them", async () => {
  await expect(
    installDebianPackages(["mariadb-server", "chromium"], [temporaryFolder()], false),
  ).rejects.toThrow(
    'Cotterpin needs the Debian packages mariadb-server and chromium: run "sudo apt-get install mariadb-server chromium" and start again.',
  );
});

test("node packages count as there when npm's own record agrees with the lock file", () => {
  const root = temporaryFolder();
  const write = (file: string, packages: object) => {
    mkdirSync(path.dirname(path.join(root, file)), { recursive: true });
    writeFileSync(path.join(root, file), JSON.stringify({ packages }));
  };
  const wanted = {
    "": {},
    "node_modules/a": { version: "1.0.0" },
    "node_modules/b": { version: "2.0.0", optional: true },
  };
  write("package-lock.json", wanted);
  expect(nodePackagesAreThere(root)).toBe(false);
  write("node_modules/.package-lock.json", { "node_modules/a": { version: "1.0.0" } });
  expect(nodePackagesAreThere(root)).toBe(true);
  write("package-lock.json", { ...wanted, "node_modules/a": { version: "1.0.1" } });
  expect(nodePackagesAreThere(root)).toBe(false);
});

test("a runner that crashes counts as a failure", () => {
  expect(withCrash(undefined, 1)).toEqual({ passed: 0, failed: 1, skipped: 0 });
  expect(withCrash({ passed: 5, failed: 0, skipped: 0 }, 1)).toEqual({ passed: 5, failed: 1, skipped: 0 });
  expect(withCrash({ passed: 5, failed: 2, skipped: 0 }, 1)).toEqual({ passed: 5, failed: 2, skipped: 0 });
});
