import type { Migration } from "./migration";
import { CREATED_AT, EXACT, ID, TABLE } from "./table-options";

const STATE = "ENUM('usable','held','staged','with-supplier')";

export const createStock: Migration = {
  name: "0004-create-stock",
  statements: [
    `CREATE TABLE IF NOT EXISTS bin (
      ${ID},
      code VARCHAR(64) NOT NULL,
      bin_key VARCHAR(64) ${EXACT} NOT NULL,
      zone VARCHAR(64) NOT NULL DEFAULT '',
      walk_order INT NOT NULL DEFAULT 0,
      description VARCHAR(255) NOT NULL DEFAULT '',
      UNIQUE KEY bin_bin_key (bin_key),
      KEY bin_walk (walk_order, bin_key),
      CONSTRAINT bin_key_not_empty CHECK (bin_key <> '')
    ) ${TABLE}`,
    `CREATE TABLE IF NOT EXISTS lot (
      ${ID},
      part_id BIGINT UNSIGNED NOT NULL,
      lot_code VARCHAR(80) ${EXACT} NOT NULL DEFAULT '',
      expires_on DATE NULL,
      ${CREATED_AT},
      UNIQUE KEY lot_part_code (part_id, lot_code),
      KEY lot_id_part (id, part_id),
      KEY lot_expires_on (expires_on),
      CONSTRAINT lot_part FOREIGN KEY (part_id) REFERENCES part (id)
    ) ${TABLE}`,
    `CREATE TABLE IF NOT EXISTS balance (
      ${ID},
      part_id BIGINT UNSIGNED NOT NULL,
      bin_id BIGINT UNSIGNED NOT NULL,
      lot_id BIGINT UNSIGNED NOT NULL,
      state ${STATE} NOT NULL,
      quantity DECIMAL(20,6) NOT NULL DEFAULT 0,
      sequence BIGINT UNSIGNED NOT NULL DEFAULT 0,
      UNIQUE KEY balance_place (part_id, bin_id, lot_id, state),
      KEY balance_bin (bin_id),
      KEY balance_lot (lot_id, part_id),
      CONSTRAINT balance_part FOREIGN KEY (part_id) REFERENCES part (id),
      CONSTRAINT balance_bin FOREIGN KEY (bin_id) REFERENCES bin (id),
      CONSTRAINT balance_lot_of_part FOREIGN KEY (lot_id, part_id) REFERENCES lot (id, part_id),
      CONSTRAINT balance_not_negative CHECK (quantity >= 0),
      CONSTRAINT balance_untouched_is_empty CHECK (sequence > 0 OR quantity = 0)
    ) ${TABLE}`,
    `CREATE TABLE IF NOT EXISTS movement (
      ${ID},
      kind ENUM('receive','return','issue','scrap','move','hold','release','adjust','reverse') NOT NULL,
      happened_at DATETIME(3) NOT NULL,
      entered_at DATETIME(3) NOT NULL DEFAULT CURRENT_TIMESTAMP(3),
      person_id BIGINT UNSIGNED NULL,
      reason VARCHAR(500) NOT NULL DEFAULT '',
      reference VARCHAR(120) ${EXACT} NOT NULL DEFAULT '',
      reverses BIGINT UNSIGNED NULL,
      idempotency_key_id BIGINT UNSIGNED NOT NULL,
      line INT UNSIGNED NOT NULL,
      UNIQUE KEY movement_reverses (reverses),
      UNIQUE KEY movement_line (idempotency_key_id, line),
      KEY movement_happened_at (happened_at, id),
      KEY movement_reference (reference, id),
      KEY movement_person (person_id, entered_at),
      CONSTRAINT movement_person FOREIGN KEY (person_id) REFERENCES person (id),
      CONSTRAINT movement_reverses_movement FOREIGN KEY (reverses) REFERENCES movement (id),
      CONSTRAINT movement_key FOREIGN KEY (idempotency_key_id) REFERENCES idempotency_key (id),
      CONSTRAINT movement_reverse_names_one CHECK ((kind = 'reverse') = (reverses IS NOT NULL))
    ) ${TABLE}`,
    `CREATE TABLE IF NOT EXISTS movement_leg (
      ${ID},
      movement_id BIGINT UNSIGNED NOT NULL,
      part_id BIGINT UNSIGNED NOT NULL,
      lot_id BIGINT UNSIGNED NOT NULL,
      bin_id BIGINT UNSIGNED NULL,
      place ENUM('bin','supplier','customer','scrap','adjustment','in-work') NOT NULL,
      state ${STATE} NULL,
      quantity DECIMAL(20,6) NOT NULL,
      sequence BIGINT UNSIGNED NULL,
      UNIQUE KEY movement_leg_sequence (part_id, bin_id, lot_id, state, sequence),
      KEY movement_leg_movement (movement_id),
      KEY movement_leg_part (part_id, id),
      KEY movement_leg_bin (bin_id, id),
      KEY movement_leg_lot (lot_id, part_id, id),
      CONSTRAINT movement_leg_of_movement FOREIGN KEY (movement_id) REFERENCES movement (id),
      CONSTRAINT movement_leg_part FOREIGN KEY (part_id) REFERENCES part (id),
      CONSTRAINT movement_leg_bin FOREIGN KEY (bin_id) REFERENCES bin (id),
      CONSTRAINT movement_leg_lot_of_part FOREIGN KEY (lot_id, part_id) REFERENCES lot (id, part_id),
      CONSTRAINT movement_leg_not_empty CHECK (quantity <> 0),
      CONSTRAINT movement_leg_in_bin CHECK (
        (place = 'bin' AND bin_id IS NOT NULL AND state IS NOT NULL AND sequence IS NOT NULL)
        OR (place <> 'bin' AND bin_id IS NULL AND state IS NULL AND sequence IS NULL))
    ) ${TABLE}`,
  ],
};
