import { beforeEach, describe, expect, test } from "vitest";
import { whyQuerySchema } from "~/schemas/planning/why";
import { getWhy } from "~/services/planning/why/get-why.server";
import { useTestDatabase as testDatabase } from "../../../support/database";
import { addStepsOf } from "../../../support/planning/add-steps-of";
import { bring, manager, refusal } from "../../imports/import-support";

testDatabase();

/** Kit = drive, 2 bolts and a box (phantom) of 3 bolts and 0.35 m of tape; the drive takes 4 bolts, one in ten scrapped, at a yield of 0.8. */
beforeEach(async () => {
  await bring("bins", "bin\nA1\nA2\n");
  await bring(
    "parts",
    "part_number,description,sourcing,decimals,unit,lead_time_days,yield,sold\nKIT,Kit,make,0,EA,2,,1\nDRIVE,Drive,make,0,EA,3,0.8,\nBOX,Box,phantom,0,EA,0,,\nBOLT,Bolt,buy,0,EA,10,,\nTAPE,Tape,buy,3,MTR,5,,\n",
  );
  await bring(
    "structure",
    "parent,component,quantity,scrap,option\nKIT,DRIVE,1,,\nKIT,BOLT,2,,\nKIT,BOX,1,,\nDRIVE,BOLT,4,0.1,\nBOX,BOLT,3,,\nBOX,TAPE,0.350,,\nKIT,TAPE,0.1,,LONG\n",
  );
  await bring(
    "stock",
    "part_number,bin,lot,state,quantity,expires_on\nBOLT,A1,L1,usable,20,2999-01-01\nBOLT,A1,L2,usable,3,\nBOLT,A2,L3,held,7,\nTAPE,A1,OLD,usable,9,2020-01-01\nDRIVE,A2,,usable,1,\n",
  );
  await bring("supply", "part_number,quantity,due,reference\nBOLT,5,2999-01-10,PO-1\n");
  await bring(
    "kit-orders",
    "number,kit,customer,priority,options\nKO-1,KIT,Marsh Rangers,1,\nKO-2,KIT,Ferry Trust,2,LONG\n",
  );
});

const why = (query: Record<string, unknown>) => getWhy(whyQuerySchema.parse(query), manager);
const all = ["KIT", "DRIVE", "BOX", "BOLT", "TAPE"];

describe("what asks for a part", () => {
  test.each(["stock", "orders"] as const)(
    "adds up to its need, and what covers it too, counted with %s",
    async (lane) => {
      for (const part of all) {
        const answer = await why({ kit: "KIT", quantity: 5, part, with: lane, options: "LONG" });
        const asked = addStepsOf([
          ...answer.causes.map(({ need }) => need),
          ...answer.demands.map(({ quantity }) => quantity),
        ]);
        expect(asked, part).toBe(addStepsOf([answer.gross]));
        expect(addStepsOf([answer.fromStock, answer.onOrder, answer.rest]), part).toBe(asked);
        if (answer.lots)
          expect(addStepsOf(answer.lots.map(({ used }) => used))).toBe(addStepsOf([answer.fromStock]));
        if (lane === "orders") {
          expect(addStepsOf(answer.orders.map(({ used }) => used))).toBe(addStepsOf([answer.onOrder]));
        }
      }
    },
  );

  test("is each line of what is built, with what goes through it", async () => {
    const answer = await why({ kit: "KIT", quantity: 5, part: "BOLT" });
    // 4 drives to make, ceil(4 / 0.8) = 5 started; ceil(5 x 4 / 0.9) = 23 bolts.
    expect(answer.causes).toMatchObject([
      { parent: { partNumber: "KIT" }, through: "5", quantity: "2", need: "10", isRounded: false },
      {
        parent: { partNumber: "DRIVE" },
        through: "5",
        quantity: "4",
        scrap: "0.1",
        need: "23",
        isRounded: true,
      },
      { parent: { partNumber: "BOX", sourcing: "phantom" }, through: "5", quantity: "3", need: "15" },
    ]);
    expect(answer).toMatchObject({ gross: "48", fromStock: "23", rest: "25", restIs: "missing" });
    expect(answer.lots).toMatchObject([
      { name: "L1", used: "20", day: "2999-01-01" },
      { name: "L2", used: "3", day: null },
    ]);
  });

  test("goes up to the kit orders and their customers", async () => {
    const answer = await why({ through: "KO-2", part: "KIT" });
    expect(answer.demands).toMatchObject([
      { kitOrder: "KO-1", customer: "Marsh Rangers", quantity: "1" },
      { kitOrder: "KO-2", customer: "Ferry Trust", quantity: "1" },
    ]);
    expect((await why({ through: "KO-2", part: "TAPE" })).gross).toBe("0.800");
    expect((await why({ through: "KO-1", part: "TAPE" })).gross).toBe("0.350");
  });

  test("counts a rung alone", async () => {
    expect(await why({ kit: "KIT", quantity: 5, kits: 2, part: "BOX" })).toMatchObject({
      kits: 2,
      gross: "2",
    });
  });
});

test("what is there and does not count is told with its bin", async () => {
  const bolt = await why({ kit: "KIT", part: "BOLT" });
  expect(bolt.outOfReach).toEqual([{ bin: "A2", lot: "L3", state: "held", quantity: "7", expiresOn: null }]);
  const tape = await why({ kit: "KIT", part: "TAPE" });
  expect(tape.outOfReach).toMatchObject([{ lot: "OLD", state: "expired", quantity: "9" }]);
  expect(tape.fromStock).toBe("0.000");
});

test("what is built names its parts, what lacks first, and more is started than is needed for its yield", async () => {
  const drive = await why({ kit: "KIT", quantity: 5, part: "DRIVE" });
  expect(drive).toMatchObject({ rest: "4", restIs: "built", started: "5", yield: "0.8" });
  expect(drive.components).toMatchObject([{ component: { partNumber: "BOLT" }, need: "23", lacking: "25" }]);
  expect(drive.chain.map(({ partNumber }) => partNumber)).toEqual(["DRIVE", "BOLT"]);
});

test("what is not there is said", async () => {
  expect((await refusal(why({ kit: "KIT", part: "NUT" }))).message).toBe("There is no part NUT in the book.");
  expect((await refusal(why({ through: "KO-9", part: "BOLT" }))).code).toBe("not-found");
  expect((await refusal(why({ part: "BOLT" }))).code).toBe("invalid");
});
