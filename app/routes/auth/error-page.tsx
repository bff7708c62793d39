import { Link } from "react-router";
import { CotterPin } from "~/components/layout/cotter-pin";

interface ErrorPageProps {
  status: number;
  /** What the guard said; anything else is a fault of ours. */
  problem?: unknown;
}

interface Words {
  heading: string;
  detail: string;
  next: string;
}

const WORDS: Record<number, Words> = {
  403: {
    heading: "Not among your rights",
    detail: "Somebody with another role can do this.",
    next: "If it should be your job too, ask a manager for the role.",
  },
  404: {
    heading: "Not here",
    detail: "There is nothing at this address.",
    next: "Check the address for a slip, or begin again at the start.",
  },
  405: {
    heading: "Not done this way",
    detail: "This address is not used in this way, so nothing was changed.",
    next: "Go back to the page before and use its buttons.",
  },
  503: {
    heading: "One moment",
    detail: "The database does not answer just now, or is busy.",
    next: "Nothing was changed. Load the page again in a few seconds.",
  },
};

const FAULT: Words = {
  heading: "Something went wrong here",
  detail: "This is a fault in the program, not in what you did.",
  next: "Load the page again. If it stays, tell whoever looks after Cotterpin.",
};

function textOf(problem: unknown, key: "detail" | "requestId"): string | undefined {
  const value = typeof problem === "object" && problem !== null ? Reflect.get(problem, key) : undefined;
  return typeof value === "string" ? value : undefined;
}

/** What went wrong, in words that say what to do. */
export function ErrorPage({ status, problem }: ErrorPageProps) {
  const words = WORDS[status] ?? FAULT;
  const detail = status < 500 ? textOf(problem, "detail") : undefined;
  const requestId = textOf(problem, "requestId");
  return (
    <section className="mx-auto w-full max-w-2xl px-4 py-12 sm:py-20">
      <CotterPin seated={false} className="h-12 w-7 overflow-visible text-soft" />
      <h1 className="mt-6 text-3xl leading-tight font-bold sm:text-4xl">{words.heading}</h1>
      <p className="mt-4 text-lg">{detail ?? words.detail}</p>
      <p className="mt-2 text-soft">{words.next}</p>
      <p className="mt-8">
        <Link to="/" className="button">
          To the start
        </Link>
      </p>
      {requestId && (
        <p className="mt-8 text-soft">
          Request <span className="figure break-all">{requestId}</span>
        </p>
      )}
    </section>
  );
}
