import type { ReactNode } from "react";

interface WhyRowsProps {
  title: string;
  /** Said under the rows: what they add up to. */
  sum?: ReactNode;
  children: ReactNode;
}

/** A list of causes whose quantities stand under one another at the right. */
export function WhyRows({ title, sum, children }: WhyRowsProps) {
  return (
    <section className="mt-6 break-inside-avoid" aria-label={title}>
      <h3 className="border-ink border-b-2 pb-1">{title}</h3>
      <ul>{children}</ul>
      {sum && <p className="flex justify-between gap-4 border-ink border-t py-2 font-bold">{sum}</p>}
    </section>
  );
}

/** One cause: its words at the left, its quantity at the right. */
export function WhyRow({ figure, children }: { figure: ReactNode; children: ReactNode }) {
  return (
    <li className="flex items-start justify-between gap-4 border-line border-t py-2 first:border-t-0">
      <div className="min-w-0">{children}</div>
      <span className="figure shrink-0 whitespace-nowrap text-right">{figure}</span>
    </li>
  );
}
