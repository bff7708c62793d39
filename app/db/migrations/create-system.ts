import type { Migration } from "./migration";
import { ASCII, CREATED_AT, EXACT, ID, TABLE } from "./table-options";

export const createSystem: Migration = {
  name: "0002-create-system",
  statements: [
    `CREATE TABLE IF NOT EXISTS setting (
      name VARCHAR(64) ${ASCII} NOT NULL PRIMARY KEY,
      value JSON NOT NULL,
      changed_at DATETIME(3) NOT NULL DEFAULT CURRENT_TIMESTAMP(3) ON UPDATE CURRENT_TIMESTAMP(3)
    ) ${TABLE}`,
    `CREATE TABLE IF NOT EXISTS revision (
      name VARCHAR(30) ${ASCII} NOT NULL PRIMARY KEY,
      value BIGINT UNSIGNED NOT NULL DEFAULT 1
    ) ${TABLE}`,
    "INSERT IGNORE INTO revision (name, value) VALUES ('structure', 1), ('stock', 1), ('orders', 1)",
    `CREATE TABLE IF NOT EXISTS idempotency_key (
      ${ID},
      \`key\` VARCHAR(200) ${ASCII} NOT NULL,
      fingerprint CHAR(64) ${ASCII} NOT NULL,
      status ENUM('running','done') NOT NULL DEFAULT 'running',
      result JSON NULL,
      actor_id BIGINT UNSIGNED NULL,
      ${CREATED_AT},
      UNIQUE KEY idempotency_key_key (\`key\`),
      KEY idempotency_key_created_at (created_at),
      CONSTRAINT idempotency_key_actor FOREIGN KEY (actor_id) REFERENCES person (id),
      CONSTRAINT idempotency_key_result CHECK (status = 'running' OR result IS NOT NULL)
    ) ${TABLE}`,
    `CREATE TABLE IF NOT EXISTS audit_event (
      ${ID},
      at DATETIME(3) NOT NULL DEFAULT CURRENT_TIMESTAMP(3),
      actor_id BIGINT UNSIGNED NULL,
      act VARCHAR(64) ${ASCII} NOT NULL,
      subject VARCHAR(200) ${EXACT} NOT NULL,
      \`before\` JSON NULL,
      \`after\` JSON NULL,
      KEY audit_event_at (at),
      KEY audit_event_subject (subject, id),
      CONSTRAINT audit_event_actor FOREIGN KEY (actor_id) REFERENCES person (id)
    ) ${TABLE}`,
    `CREATE TABLE IF NOT EXISTS outbox (
      ${ID},
      message_id VARCHAR(190) ${ASCII} NOT NULL,
      to_address VARCHAR(190) NOT NULL,
      subject VARCHAR(255) NOT NULL,
      body MEDIUMTEXT NOT NULL,
      state ENUM('waiting','sent','dead') NOT NULL DEFAULT 'waiting',
      tries INT UNSIGNED NOT NULL DEFAULT 0,
      next_at DATETIME(3) NOT NULL DEFAULT CURRENT_TIMESTAMP(3),
      lease_until DATETIME(3) NULL,
      ${CREATED_AT},
      UNIQUE KEY outbox_message_id (message_id),
      KEY outbox_next (state, next_at, id)
    ) ${TABLE}`,
  ],
};
