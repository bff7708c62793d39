import type { ImportAnswer } from "~/schemas/imports/import-answer";
import type { ImportKindName } from "~/schemas/imports/import-kind-name";
import { importBins } from "./import-bins.server";
import { importKitOrders } from "./import-kit-orders.server";
import { importMovements } from "./import-movements.server";
import { importOffers } from "./import-offers.server";
import { importParts } from "./import-parts.server";
import { importStock } from "./import-stock.server";
import { importStructure } from "./import-structure.server";
import { importSuppliers } from "./import-suppliers.server";
import { importSupply } from "./import-supply.server";
import { rememberHeaders } from "./remember-headers.server";
import type { ImportRequest } from "./run-import.server";

const imports: Record<ImportKindName, (request: ImportRequest) => Promise<ImportAnswer>> = {
  suppliers: importSuppliers,
  bins: importBins,
  parts: importParts,
  structure: importStructure,
  offers: importOffers,
  movements: importMovements,
  stock: importStock,
  supply: importSupply,
  "kit-orders": importKitOrders,
};

/**
 * Imports a file of any kind; headers that were matched by hand are remembered for the next file of that kind. Throws as
 * `runImport` does.
 */
export async function importFile(kind: ImportKindName, request: ImportRequest): Promise<ImportAnswer> {
  const answer = await imports[kind](request);
  const { dryRun = false, headers = {} } = request;
  if (!dryRun && Object.keys(headers).length > 0) await rememberHeaders(kind, headers);
  return answer;
}
