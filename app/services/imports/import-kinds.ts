import { binsKind } from "~/schemas/imports/bins";
import type { ImportKind } from "~/schemas/imports/import-kind";
import type { ImportKindName } from "~/schemas/imports/import-kind-name";
import { kitOrdersKind } from "~/schemas/imports/kit-orders";
import { movementsKind } from "~/schemas/imports/movements";
import { offersKind } from "~/schemas/imports/offers";
import { partsKind } from "~/schemas/imports/parts";
import { stockKind } from "~/schemas/imports/stock";
import { structureKind } from "~/schemas/imports/structure";
import { suppliersKind } from "~/schemas/imports/suppliers";
import { supplyKind } from "~/schemas/imports/supply";
import type { Act } from "~/schemas/people/act";

/** The act that lets a person bring in each kind of file; the importers ask it again. */
export const IMPORT_ACTS: Readonly<Record<ImportKindName, Act>> = {
  suppliers: "import-suppliers",
  bins: "import-bins",
  parts: "import-parts",
  structure: "import-parts",
  offers: "import-offers",
  movements: "import-stock",
  stock: "import-stock",
  supply: "import-supply",
  "kit-orders": "import-kit-orders",
};

/** The columns of each kind of file. */
export const IMPORT_COLUMNS: Readonly<Record<ImportKindName, ImportKind<unknown>["columns"]>> = {
  suppliers: suppliersKind.columns,
  bins: binsKind.columns,
  parts: partsKind.columns,
  structure: structureKind.columns,
  offers: offersKind.columns,
  movements: movementsKind.columns,
  stock: stockKind.columns,
  supply: supplyKind.columns,
  "kit-orders": kitOrdersKind.columns,
};
