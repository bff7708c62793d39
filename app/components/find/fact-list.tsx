import type { ReactNode } from "react";

export interface Fact {
  name: string;
  value: ReactNode;
}

/** Names and values, a line each. */
export function FactList({ facts }: { facts: Fact[] }) {
  return (
    <dl className="mt-1">
      {facts.map(({ name, value }) => (
        <div
          key={name}
          className="flex flex-wrap items-baseline justify-between gap-x-6 border-line border-b py-1.5 last:border-b-0"
        >
          <dt className="text-soft">{name}</dt>
          <dd className="min-w-0 break-words text-right">{value}</dd>
        </div>
      ))}
    </dl>
  );
}
