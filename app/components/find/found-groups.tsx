import { Link } from "react-router";
import type { FoundGroup } from "~/schemas/find/find-answer";
import { formatNumber } from "~/utils/format/format-number";
import { KIND_WORDS } from "./kind-words";

/** What was found, kind by kind. */
export function FoundGroups({ groups }: { groups: FoundGroup[] }) {
  const total = groups.reduce((sum, { found, more }) => sum + found.length + more, 0);
  return (
    <>
      <p role="status" className="text-soft">
        {total === 1 ? "One thing found." : `${formatNumber(total)} things found.`}
      </p>
      <div className="mt-3 grid gap-4">
        {groups.map((group) => (
          <section key={group.kind} aria-labelledby={`found-${group.kind}`} className="sheet">
            <h2 id={`found-${group.kind}`} className="text-lg">
              {KIND_WORDS[group.kind]}
            </h2>
            <ul className="mt-2">
              {group.found.map(({ name, words, to }) => (
                <li key={to} className="border-line border-t first:border-t-0">
                  <Link
                    to={to}
                    className="grid gap-x-6 py-2 no-underline hover:underline sm:grid-cols-[14rem_minmax(0,1fr)]"
                  >
                    <span className="figure break-words font-semibold underline">{name}</span>{" "}
                    <span className="min-w-0 break-words">{words}</span>
                  </Link>
                </li>
              ))}
            </ul>
            {group.more > 0 && (
              <p className="mt-2 text-soft">
                {formatNumber(group.more)} more: another word, or more of the number, narrows the list.
              </p>
            )}
          </section>
        ))}
      </div>
    </>
  );
}
