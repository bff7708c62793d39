import { Link } from "react-router";
import { ROLE_NAMES } from "~/schemas/people/role";
import { formatMoment } from "~/utils/format/format-moment";
import { PERSON_STATES, type PersonFacts } from "./person-facts";

/** Everybody, with what they may do and when they were here. On a narrow page each becomes a small block. */
export function PeopleList({ people }: { people: PersonFacts[] }) {
  return (
    <section className="sheet" aria-label="Everybody">
      <table className="w-full max-md:block">
        <caption className="pb-2 text-left text-lg font-bold max-md:block">Everybody</caption>
        <thead className="max-md:sr-only">
          <tr className="border-ink border-b-2 text-left text-[0.9375rem]">
            {["Person", "Roles", "Place", "Last seen"].map((head) => (
              <th key={head} scope="col" className="py-2 pr-4 font-normal last:pr-0">
                {head}
              </th>
            ))}
          </tr>
        </thead>
        <tbody className="max-md:block">
          {people.map((person) => (
            <PersonRow key={person.id} person={person} />
          ))}
        </tbody>
      </table>
    </section>
  );
}

function PersonRow({ person }: { person: PersonFacts }) {
  const { id, name, email, roles, state, seenAt } = person;
  return (
    <tr className="border-line border-b align-top last:border-b-0 max-md:grid max-md:gap-y-1 max-md:py-4">
      <th scope="row" className="text-left md:py-3 md:pr-4">
        <Link to={`/admin/people/${id}`} className="-my-2 inline-block py-2 underline">
          {name}
        </Link>
        <span className="block font-normal text-[0.9375rem] text-soft [overflow-wrap:anywhere]">{email}</span>
      </th>
      <td className="md:py-3 md:pr-4">
        {roles.map((role) => ROLE_NAMES[role]).join(", ") || <span className="text-soft">no role</span>}
      </td>
      <td className="md:py-3 md:pr-4">
        <span aria-hidden="true">{state === "in" ? "✓" : state === "invited" ? "…" : "✕"} </span>
        {PERSON_STATES[state]}
      </td>
      <td className="md:whitespace-nowrap md:py-3">
        {seenAt ? (
          <span className="figure">{formatMoment(seenAt)}</span>
        ) : (
          <span className="text-soft">not yet</span>
        )}
      </td>
    </tr>
  );
}
