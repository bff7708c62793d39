import type { Role } from "~/schemas/people/role";

/** Who posts. */
export interface StockActor {
  /** Null for the program itself and for a token without a person. */
  personId: number | null;
  roles: readonly Role[];
}
