import { Form } from "react-router";

interface DemoChoicesProps {
  people: { role: string; roleName: string; name: string; email: string; password: string }[];
}

const COMES_TO: Record<string, string> = {
  clerk: "counts and puts away",
  planner: "sees which kits can ship, and what stops the rest",
  purchaser: "raises reorders",
  builder: "pulls pick lists and builds",
  manager: "keeps it right",
};

/** The five invented people of the demo, each one press away. */
export function DemoChoices({ people }: DemoChoicesProps) {
  return (
    <section aria-labelledby="demo-heading" className="sheet">
      <h2 id="demo-heading" className="text-lg font-bold">
        Look around as
      </h2>
      <p className="text-soft">Saltmarsh Craft and everybody in it are invented. Change what you like.</p>
      <ul className="mt-3 border-line border-t">
        {people.map((person) => (
          <li key={person.email} className="border-line border-b">
            <Form method="post">
              <input type="hidden" name="email" value={person.email} />
              <input type="hidden" name="password" value={person.password} />
              <button
                type="submit"
                className="group flex min-h-14 w-full cursor-pointer items-center justify-between gap-4 py-2 text-left"
              >
                <span>
                  <span className="block">
                    <span className="font-bold group-hover:underline">{person.name}</span>, {person.roleName}
                  </span>
                  <span className="block text-soft">{COMES_TO[person.role]}</span>
                </span>
                <svg viewBox="0 0 8 12" aria-hidden="true" className="h-3 w-2 shrink-0" fill="none">
                  <path d="M1.5 1l5 5-5 5" stroke="currentColor" strokeWidth="1.75" />
                </svg>
              </button>
            </Form>
          </li>
        ))}
      </ul>
    </section>
  );
}
