import { compileSupplies } from "~/domain/planning/compile-supplies";
import { demoPlanInput } from "../../support/demo-files";

/** The demo firm's day. */
const TODAY = "2026-12-01";

/** The demo firm compiled for planning, from its files. */
export function demoPlan() {
  const { structure, stock, supply } = demoPlanInput();
  return { structure, supplies: compileSupplies(structure, stock, supply, TODAY) };
}
