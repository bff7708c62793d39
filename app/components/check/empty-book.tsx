/** Check before there is anything to check. */
export function EmptyBook() {
  return (
    <div className="max-w-prose py-8">
      <h2 className="text-2xl">There is no kit in the book yet.</h2>
      <p className="mt-3">
        A kit is a part that is built here and sold. Bring in the parts and then the structure, which says
        what goes into what; after that this page answers which kits can ship. A planner or the manager can do
        it.
      </p>
    </div>
  );
}
