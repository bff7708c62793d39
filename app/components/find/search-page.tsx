import { Form } from "react-router";
import type { FindAnswer } from "~/schemas/find/find-answer";
import { FoundGroups } from "./found-groups";

/** The page Find: one box for everything that has a number or a name. */
export function SearchPage({ answer }: { answer: FindAnswer }) {
  return (
    <>
      <h1 className="text-2xl sm:text-[2rem]">Find</h1>
      <Form
        action="/find"
        className="mt-4 flex max-w-2xl items-end gap-3"
        role="search"
        aria-label="The book"
      >
        <input type="hidden" name="go" value="1" />
        <label className="min-w-0 flex-1">
          <span className="mb-1 block font-bold">Number or words</span>
          <input
            key={answer.q}
            type="search"
            name="q"
            defaultValue={answer.q}
            autoComplete="off"
            maxLength={200}
            className="field min-h-12"
          />
        </label>
        <button type="submit" className="button button-main min-h-12">
          Find
        </button>
      </Form>
      <div className="mt-6">{answer.q === "" ? <BeforeSearch /> : <Outcome answer={answer} />}</div>
    </>
  );
}

function BeforeSearch() {
  return (
    <p className="max-w-prose text-soft">
      Parts, bins, lots, suppliers, purchase orders, shop orders and kit orders: type or scan the number, a
      piece of it, or words of the description in any order. What is called exactly so opens at once.
    </p>
  );
}

function Outcome({ answer }: { answer: FindAnswer }) {
  if (answer.groups.length > 0) return <FoundGroups groups={answer.groups} />;
  return (
    <div role="status" className="max-w-prose">
      <p className="text-lg">
        Nothing in the book has <strong className="figure break-words">{answer.q}</strong> in its number, name
        or description.
      </p>
      <p className="mt-2 text-soft">
        Try a shorter piece of the number, fewer words, or the word without its ending: each word must stand
        somewhere in what you look for.
      </p>
    </div>
  );
}
