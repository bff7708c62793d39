import { createOrders } from "./create-orders";
import { createParts } from "./create-parts";
import { createPeople } from "./create-people";
import { createPersonLinks } from "./create-person-links";
import { createSecondFactors } from "./create-second-factors";
import { createStock } from "./create-stock";
import { createSystem } from "./create-system";
import { indexMovements } from "./index-movements";
import type { Migration } from "./migration";
import { refuseChangedFacts } from "./refuse-changed-facts";

/** In the order in which they run. A list, because file names differ between source and build. */
export const ALL_MIGRATIONS: readonly Migration[] = [
  createPeople,
  createSystem,
  createParts,
  createStock,
  createOrders,
  refuseChangedFacts,
  createPersonLinks,
  createSecondFactors,
  indexMovements,
];
