import type { Migration } from "./migration";
import { ASCII, CREATED_AT, ID, TABLE } from "./table-options";

/** Links by mail that let a person set a password, and what the outbox needs to say how a mail ended. */
export const createPersonLinks: Migration = {
  name: "0008-create-person-links",
  statements: [
    `CREATE TABLE IF NOT EXISTS person_link (
      ${ID},
      person_id BIGINT UNSIGNED NOT NULL,
      kind ENUM('invitation','password') NOT NULL,
      link_hash CHAR(64) ${ASCII} NOT NULL,
      ${CREATED_AT},
      expires_at DATETIME(3) NOT NULL,
      used_at DATETIME(3) NULL,
      withdrawn_at DATETIME(3) NULL,
      UNIQUE KEY person_link_hash (link_hash),
      CONSTRAINT person_link_person FOREIGN KEY (person_id) REFERENCES person (id) ON DELETE CASCADE
    ) ${TABLE}`,
    `ALTER TABLE outbox
      MODIFY COLUMN state ENUM('waiting','sent','caught','dead') NOT NULL DEFAULT 'waiting',
      ADD COLUMN IF NOT EXISTS ended_at DATETIME(3) NULL,
      ADD COLUMN IF NOT EXISTS fault VARCHAR(255) NULL`,
  ],
};
