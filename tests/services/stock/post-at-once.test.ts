import { afterEach, beforeEach, describe, expect, it } from "vitest";
import { useTestDatabase } from "../../support/database";
import { expectSoundLedger } from "./expect-sound-ledger";
import { buildBin, buildPart, faultOf, issue, newKey, postPatiently, receive } from "./stock-builders";

const database = useTestDatabase();
const onHand = async () => (await database.query("SELECT SUM(quantity) AS total FROM balance"))[0].total;

describe("posting at the same time", () => {
  beforeEach(async () => {
    for (const number of ["HB-2041", "CL-100", "SK-310", "FN-7"]) await buildPart(number);
    await buildBin("A12");
    await buildBin("A21");
  });
  afterEach(expectSoundLedger);

  it("loses none of 16 clients x 100 postings on one part", { timeout: 180_000 }, async () => {
    const client = async () => {
      for (let n = 0; n < 100; n++) await postPatiently([receive("HB-2041", "1", "A12")]);
    };
    await Promise.all(Array.from({ length: 16 }, client));
    expect(await onHand()).toBe("1600.000000");
  });

  it("sells exactly 100 of 300 x 1,000 out of 100,000", { timeout: 90_000 }, async () => {
    await postPatiently([receive("HB-2041", "100000", "A12")]);
    const sales = Array.from({ length: 300 }, () => postPatiently([issue("HB-2041", "1000", "A12")]));
    const answers = await Promise.allSettled(sales);
    expect(answers.filter((answer) => answer.status === "fulfilled")).toHaveLength(100);
    const refusals = answers.flatMap((answer) => (answer.status === "rejected" ? [answer.reason.code] : []));
    expect(new Set(refusals)).toEqual(new Set(["conflict"]));
    expect(await onHand()).toBe("0.000000");
  });

  it("has one effect for one key sent 200 times", { timeout: 90_000 }, async () => {
    const key = newKey();
    const sends = Array.from({ length: 200 }, () => patientlyUntilDone(key));
    const answers = await Promise.all(sends);
    expect(new Set(answers.map((answer) => answer.movements[0].id)).size).toBe(1);
    expect((await faultOf(postPatiently([receive("HB-2041", "8", "A12")], key))).code).toBe("invalid");
    expect(await onHand()).toBe("7.000000");
  });

  it("makes lots and balances that are new, in any order of parts, without a failure", {
    timeout: 30_000,
  }, async () => {
    const numbers = ["HB-2041", "CL-100", "SK-310", "FN-7"];
    const posts = Array.from({ length: 120 }, (_, n) => {
      const turned = [...numbers.slice(n % 4), ...numbers.slice(0, n % 4)];
      const lot = `L${n % 10}`;
      return postPatiently(turned.map((number) => ({ ...receive(number, "1", n % 2 ? "A12" : "A21"), lot })));
    });
    await Promise.all(posts);
    expect(await onHand()).toBe("480.000000");
  });
});

/** A first request that still runs answers 409; the client comes back. */
async function patientlyUntilDone(key: string) {
  for (;;) {
    try {
      return await postPatiently([receive("HB-2041", "7", "A12")], key);
    } catch (error) {
      if ((error as { code?: string }).code !== "conflict") throw error;
    }
  }
}
