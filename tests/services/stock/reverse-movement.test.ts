import { afterEach, beforeEach, describe, expect, it } from "vitest";
import { Person } from "~/db/models/people/person";
import { PersonRole } from "~/db/models/people/person-role";
import { postMovements } from "~/services/stock/post-movements.server";
import { reverseMovement } from "~/services/stock/reverse-movement.server";
import { useTestDatabase } from "../../support/database";
import { expectSoundLedger } from "./expect-sound-ledger";
import { buildBin, buildPart, faultOf, issue, MANAGER, newKey, post, receive } from "./stock-builders";

const database = useTestDatabase();
const reverse = (movementId: number, reason = "entered twice") =>
  reverseMovement({ actor: MANAGER, movementId, reason });
const onHand = async () => (await database.query("SELECT SUM(quantity) AS total FROM balance"))[0].total;

describe("reverseMovement", () => {
  beforeEach(async () => {
    await buildPart("HB-2041");
    await buildBin("A12");
  });
  afterEach(expectSoundLedger);

  it("posts the opposite, dated as the first, and names it", async () => {
    const { movements } = await post([
      { ...receive("HB-2041", "5", "A12"), happenedAt: "2026-01-02T08:00:00Z" },
    ]);
    const reversed = await reverse(movements[0].id);
    expect(reversed.reverses).toBe(movements[0].id);
    expect(await onHand()).toBe("0.000000");
    const rows = await database.query("SELECT kind, reverses, happened_at AS at FROM movement ORDER BY id");
    expect(rows[1]).toMatchObject({ kind: "reverse", reverses: movements[0].id, at: rows[0].at });
  });

  it("reverses once, also when twenty ask at the same time", async () => {
    const { movements } = await post([receive("HB-2041", "5", "A12")]);
    const answers = await Promise.allSettled(Array.from({ length: 20 }, () => reverse(movements[0].id)));
    expect(answers.filter((answer) => answer.status === "fulfilled")).toHaveLength(1);
    expect((await faultOf(reverse(movements[0].id))).code).toBe("conflict");
    expect(await onHand()).toBe("0.000000");
  });

  it("refuses what is unknown, a reversal, no reason, and stock that has gone on", async () => {
    const { movements } = await post([receive("HB-2041", "5", "A12")]);
    const spent = await post([issue("HB-2041", "3", "A12")]);
    expect((await faultOf(reverse(999_999))).code).toBe("not-found");
    expect((await faultOf(reverse(movements[0].id, " "))).code).toBe("invalid");
    const fault = await faultOf(reverse(movements[0].id));
    expect(fault.message).toBe(
      "HB-2041 in bin A12 (usable): 2 EA on hand, not enough to take 5 EA. Nothing was posted.",
    );
    const back = await reverse(spent.movements[0].id);
    expect((await faultOf(reverse(back.id))).code).toBe("conflict");
  });

  it("is for who made the movement, the same day, and for the manager", async () => {
    const [mine, other] = await Promise.all(["wren", "tam"].map(buildClerk));
    const posting = { actor: mine, idempotencyKey: newKey(), movements: [receive("HB-2041", "5", "A12")] };
    const { movements } = await postMovements(posting);
    const by = (actor: typeof mine) =>
      reverseMovement({ actor, movementId: movements[0].id, reason: "wrong bin" });
    expect((await faultOf(by(other))).code).toBe("forbidden");
    await by(mine);
  });
});

async function buildClerk(name: string) {
  const person = await Person.create({ name, email: `${name}@saltmarsh.example`, passwordHash: "none" });
  await PersonRole.create({ personId: person.id, role: "clerk" });
  return { personId: person.id, roles: ["clerk" as const] };
}
