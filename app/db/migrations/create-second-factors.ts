import type { Migration } from "./migration";
import { ASCII, CREATED_AT, ID, TABLE } from "./table-options";

/** The second factor of signing in, its recovery codes, those who have shown only the password yet, and where sessions are. */
export const createSecondFactors: Migration = {
  name: "0007-create-second-factors",
  statements: [
    `CREATE TABLE IF NOT EXISTS second_factor (
      person_id BIGINT UNSIGNED NOT NULL PRIMARY KEY,
      sealed_secret VARCHAR(255) ${ASCII} NOT NULL,
      last_step BIGINT UNSIGNED NOT NULL DEFAULT 0,
      ${CREATED_AT},
      confirmed_at DATETIME(3) NULL,
      CONSTRAINT second_factor_person FOREIGN KEY (person_id) REFERENCES person (id) ON DELETE CASCADE
    ) ${TABLE}`,
    `CREATE TABLE IF NOT EXISTS recovery_code (
      ${ID},
      person_id BIGINT UNSIGNED NOT NULL,
      code_hash CHAR(64) ${ASCII} NOT NULL,
      used_at DATETIME(3) NULL,
      UNIQUE KEY recovery_code_hash (person_id, code_hash),
      CONSTRAINT recovery_code_person FOREIGN KEY (person_id) REFERENCES person (id) ON DELETE CASCADE
    ) ${TABLE}`,
    `CREATE TABLE IF NOT EXISTS half_sign_in (
      id_hash CHAR(64) ${ASCII} NOT NULL PRIMARY KEY,
      person_id BIGINT UNSIGNED NOT NULL,
      ${CREATED_AT},
      expires_at DATETIME(3) NOT NULL,
      KEY half_sign_in_expires_at (expires_at),
      CONSTRAINT half_sign_in_person FOREIGN KEY (person_id) REFERENCES person (id) ON DELETE CASCADE
    ) ${TABLE}`,
    "ALTER TABLE session ADD COLUMN IF NOT EXISTS browser VARCHAR(60) NULL, ADD COLUMN IF NOT EXISTS address VARCHAR(64) NULL",
  ],
};
