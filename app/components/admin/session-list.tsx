import { Form } from "react-router";
import { formatMoment } from "~/utils/format/format-moment";

interface SessionListProps {
  sessions: {
    key: string;
    browser: string | null;
    address: string | null;
    createdAt: string;
    seenAt: string;
    isThis?: boolean;
  }[];
  /** With a button that ends all but the one that looks. */
  endOthers?: boolean;
}

/** Where a person is signed in, each with a button that ends it. */
export function SessionList({ sessions, endOthers = false }: SessionListProps) {
  return (
    <section className="sheet" aria-label="Sessions">
      <h2 className="text-lg">Sessions</h2>
      {sessions.length === 0 && <p className="mt-2 text-soft">Not signed in anywhere just now.</p>}
      <ul>
        {sessions.map(({ key, browser, address, createdAt, seenAt, isThis }) => (
          <li
            key={key}
            className="flex flex-wrap items-center justify-between gap-x-6 gap-y-2 border-line border-b py-3 last:border-b-0"
          >
            <p>
              Last seen <span className="figure">{formatMoment(seenAt)}</span>
              <span className="block text-[0.9375rem] text-soft">
                {[browser, address !== "here" && address].filter(Boolean).join(", from ")} began{" "}
                <span className="figure">{formatMoment(createdAt)}</span>
              </span>
            </p>
            {isThis ? (
              <span className="font-bold">This one</span>
            ) : (
              <Form method="post">
                <input type="hidden" name="session" value={key} />
                <button
                  type="submit"
                  name="intent"
                  value="end-session"
                  className="button"
                  aria-label={`End the session begun ${formatMoment(createdAt)}`}
                >
                  End
                </button>
              </Form>
            )}
          </li>
        ))}
      </ul>
      {endOthers && sessions.length > 1 && (
        <Form method="post" className="mt-3">
          <button type="submit" name="intent" value="end-others" className="button">
            End all others
          </button>
        </Form>
      )}
    </section>
  );
}
