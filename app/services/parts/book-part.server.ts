import { partKey } from "~/domain/planning/part-key";
import { getPlanBook, type PlanBook } from "~/services/planning/get-plan-book.server";
import { AppError } from "~/utils/errors";

/** The book, and the number in it of the part. Throws 404 where there is no such part. */
export async function findBookPart(partNumber: string): Promise<{ book: PlanBook; number: number }> {
  const book = await getPlanBook();
  const number = book.structure.numberOf.get(partKey(partNumber));
  if (number === undefined) {
    throw new AppError(
      "not-found",
      `There is no part ${partNumber} in the book. Check the number or search for it.`,
    );
  }
  return { book, number };
}
