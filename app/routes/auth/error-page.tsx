import { Link } from "react-router";

interface ErrorPageProps {
  status: number;
  /** What the guard said; anything else is shown as a fault of ours. */
  problem?: { detail?: string; requestId?: string };
}

const HEADINGS: Record<number, string> = {
  403: "Not among your rights",
  404: "Not here",
  503: "One moment",
};

export function ErrorPage({ status, problem }: ErrorPageProps) {
  return (
    <section className="mx-auto max-w-prose py-16">
      <h1 className="text-3xl font-bold">{HEADINGS[status] ?? "Something went wrong here"}</h1>
      <p className="mt-4">{problem?.detail ?? "Try again."}</p>
      <Link to="/">To the start</Link>
    </section>
  );
}
