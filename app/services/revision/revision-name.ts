/** What a revision counts the changes of. */
export type RevisionName = "structure" | "stock" | "orders";
