import { Form, Link } from "react-router";
import { Field } from "~/components/forms/field";
import type { AuditSearch } from "~/schemas/people/audit-search";

interface AuditSearchFormProps {
  search: AuditSearch;
  acts: string[];
}

/** What to look for in the audit; it stays in the address, so that it can be sent to a colleague. */
export function AuditSearchForm({ search, acts }: AuditSearchFormProps) {
  const input = (name: "who" | "subject" | "text", label: string) => (
    <Field label={label} name={name}>
      {(attributes) => <input {...attributes} className="field" defaultValue={search[name]} />}
    </Field>
  );
  const day = (name: "from" | "to", label: string) => (
    <Field label={label} name={name}>
      {(attributes) => <input {...attributes} type="date" className="field" defaultValue={search[name]} />}
    </Field>
  );
  return (
    <Form
      key={JSON.stringify(search)}
      method="get"
      role="search"
      aria-label="The audit"
      className="sheet grid gap-4 sm:grid-cols-2 lg:grid-cols-3"
    >
      {input("who", "Who")}
      <Field label="Act" name="act">
        {(attributes) => (
          <select {...attributes} className="field" defaultValue={search.act ?? ""}>
            <option value="">any</option>
            {acts.map((act) => (
              <option key={act} value={act}>
                {act.replaceAll("-", " ")}
              </option>
            ))}
          </select>
        )}
      </Field>
      {input("subject", "Done to")}
      {day("from", "From")}
      {day("to", "To")}
      {input("text", "Before or after holds")}
      <div className="flex flex-wrap items-center gap-4 sm:col-span-2 lg:col-span-3">
        <button type="submit" className="button button-main">
          Search
        </button>
        <Link to="/admin/audit" className="px-2 py-3 underline">
          Show all
        </Link>
      </div>
    </Form>
  );
}
