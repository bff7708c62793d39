import { beforeEach, describe, expect, it } from "vitest";
import { checkCredentials } from "~/services/people/check-credentials.server";
import { countAttempt } from "~/services/people/count-attempt.server";
import { hashPassword } from "~/services/people/hash-password.server";
import { verifyPassword } from "~/services/people/verify-password.server";
import { AppError } from "~/utils/errors";
import { useTestDatabase } from "../../support/database";
import { insertPerson, PASSWORD } from "../../support/people/insert-person";

const database = useTestDatabase();

const email = "idris@saltmarsh.example";
const password = PASSWORD;
const address = "192.0.2.7";

async function faultOf(work: Promise<unknown>): Promise<AppError> {
  const fault = await work.then(
    () => undefined,
    (error: unknown) => error,
  );
  expect(fault).toBeInstanceOf(AppError);
  return fault as AppError;
}

/** Failures are put in directly: to make them by hand takes half a second each. */
async function failBefore(count: number, minutesAgo = 0, account = email, from = address): Promise<void> {
  for (let n = 0; n < count; n++) await countAttempt({ account, address: from });
  if (minutesAgo > 0) {
    await database.query("UPDATE sign_in_attempt SET at = at - INTERVAL ? MINUTE", [minutesAgo]);
  }
}

describe("checkCredentials", () => {
  let personId: number;

  beforeEach(async () => {
    personId = await insertPerson(["planner"], { name: "Idris Fenwick", email });
  });

  it("knows the person by address and password", async () => {
    expect(await checkCredentials({ email, password, address })).toBe(personId);
  });

  it("answers wrong passwords, unknown and disabled people alike", async () => {
    const wrong = await faultOf(checkCredentials({ email, password: "wrong", address }));
    const unknown = await faultOf(checkCredentials({ email: "nobody@saltmarsh.example", password, address }));
    await database.query("UPDATE person SET disabled_at = NOW(3)");
    const disabled = await faultOf(checkCredentials({ email, password, address }));
    expect(wrong.code).toBe("invalid");
    expect(unknown).toMatchObject({ code: wrong.code, message: wrong.message, errors: wrong.errors });
    expect(disabled).toMatchObject({ code: wrong.code, message: wrong.message, errors: wrong.errors });
  });

  it("takes as long for somebody unknown", async () => {
    const hash = await hashPassword(password);
    const time = async (kept: string | undefined) => {
      const start = performance.now();
      await verifyPassword("wrong", kept);
      return performance.now() - start;
    };
    await time(undefined);
    const known = await time(hash);
    const unknown = await time(undefined);
    expect(unknown).toBeGreaterThan(known / 3);
    expect(known).toBeGreaterThan(unknown / 3);
  });

  it("refuses after ten failures, the right password too, and says when to come back", async () => {
    await failBefore(10, 5);
    const fault = await faultOf(checkCredentials({ email, password, address }));
    expect(fault.code).toBe("too-many");
    expect(fault.retryAfter).toBeGreaterThan(9 * 60);
    expect(fault.retryAfter).toBeLessThanOrEqual(10 * 60 + 1);
    expect(fault.message).toMatch(/^Too many tries\. Wait \d+ minutes, then try again\.$/);
  });

  it("does the same for an account that is not there", async () => {
    await failBefore(10, 0, "nobody@saltmarsh.example");
    const fault = await faultOf(checkCredentials({ email: "nobody@saltmarsh.example", password, address }));
    expect(fault.code).toBe("too-many");
  });

  it("lets people in again after a quarter of an hour, however often they were refused", async () => {
    await failBefore(10);
    for (let n = 0; n < 3; n++) await faultOf(checkCredentials({ email, password, address }));
    await database.query("UPDATE sign_in_attempt SET at = at - INTERVAL 15 MINUTE");
    expect(await checkCredentials({ email, password, address })).toBe(personId);
  });

  it("does not count successes", async () => {
    await failBefore(9);
    await checkCredentials({ email, password, address });
    expect(await checkCredentials({ email, password, address })).toBe(personId);
  });

  it("refuses an address that tries many accounts, and only that one", async () => {
    for (let n = 0; n < 60; n++) await countAttempt({ account: `someone-${n}`, address });
    expect((await faultOf(checkCredentials({ email, password, address }))).code).toBe("too-many");
    expect(await checkCredentials({ email, password, address: "192.0.2.8" })).toBe(personId);
  });

  it("lets no more than ten of many at once through", async () => {
    const tries = await Promise.allSettled(
      Array.from({ length: 30 }, () => countAttempt({ account: "one", address })),
    );
    expect(tries.filter(({ status }) => status === "fulfilled").length).toBeLessThanOrEqual(10);
  });
});
