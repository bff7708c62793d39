/** The name of an operation's schema in the document: `getPart` answers with `GetPartAnswer`. */
export function schemaName(id: string, of: "Body" | "Answer"): string {
  return id[0].toUpperCase() + id.slice(1) + of;
}
