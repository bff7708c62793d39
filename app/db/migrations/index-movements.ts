import type { Migration } from "./migration";

/** A page of one part's movements is found in their order, however many the ledger holds. */
export const indexMovements: Migration = {
  name: "0009-index-movements",
  statements: [
    "ALTER TABLE movement_leg ADD KEY IF NOT EXISTS movement_leg_part_movement (part_id, movement_id)",
  ],
};
