import type { Migration } from "./migration";
import { ASCII, CREATED_AT, EXACT, ID, TABLE } from "./table-options";

const ROLE = "ENUM('clerk','planner','purchaser','builder','manager')";

export const createPeople: Migration = {
  name: "0001-create-people",
  statements: [
    `CREATE TABLE IF NOT EXISTS person (
      ${ID},
      name VARCHAR(120) NOT NULL,
      email VARCHAR(190) ${EXACT} NOT NULL,
      password_hash VARCHAR(255) ${ASCII} NOT NULL,
      disabled_at DATETIME(3) NULL,
      ${CREATED_AT},
      UNIQUE KEY person_email (email)
    ) ${TABLE}`,
    `CREATE TABLE IF NOT EXISTS person_role (
      person_id BIGINT UNSIGNED NOT NULL,
      role ${ROLE} NOT NULL,
      PRIMARY KEY (person_id, role),
      CONSTRAINT person_role_person FOREIGN KEY (person_id) REFERENCES person (id) ON DELETE CASCADE
    ) ${TABLE}`,
    `CREATE TABLE IF NOT EXISTS session (
      id_hash CHAR(64) ${ASCII} NOT NULL PRIMARY KEY,
      person_id BIGINT UNSIGNED NOT NULL,
      ${CREATED_AT},
      seen_at DATETIME(3) NOT NULL DEFAULT CURRENT_TIMESTAMP(3),
      expires_at DATETIME(3) NOT NULL,
      KEY session_expires_at (expires_at),
      CONSTRAINT session_person FOREIGN KEY (person_id) REFERENCES person (id) ON DELETE CASCADE
    ) ${TABLE}`,
    `CREATE TABLE IF NOT EXISTS api_token (
      ${ID},
      token_hash CHAR(64) ${ASCII} NOT NULL,
      person_id BIGINT UNSIGNED NULL,
      role ${ROLE} NULL,
      name VARCHAR(120) NOT NULL,
      ${CREATED_AT},
      revoked_at DATETIME(3) NULL,
      UNIQUE KEY api_token_hash (token_hash),
      CONSTRAINT api_token_person FOREIGN KEY (person_id) REFERENCES person (id) ON DELETE CASCADE,
      CONSTRAINT api_token_owner CHECK (person_id IS NOT NULL OR role IS NOT NULL)
    ) ${TABLE}`,
    `CREATE TABLE IF NOT EXISTS sign_in_attempt (
      ${ID},
      account_key VARCHAR(190) ${EXACT} NOT NULL,
      address VARCHAR(64) ${ASCII} NOT NULL,
      succeeded BOOLEAN NOT NULL,
      at DATETIME(3) NOT NULL DEFAULT CURRENT_TIMESTAMP(3),
      KEY sign_in_attempt_account (account_key, at),
      KEY sign_in_attempt_address (address, at)
    ) ${TABLE}`,
    `CREATE TABLE IF NOT EXISTS setup_code (
      ${ID},
      code_hash CHAR(64) ${ASCII} NOT NULL,
      ${CREATED_AT},
      expires_at DATETIME(3) NOT NULL,
      used_at DATETIME(3) NULL,
      UNIQUE KEY setup_code_hash (code_hash)
    ) ${TABLE}`,
  ],
};
