/** Ends every CREATE TABLE. */
export const TABLE = "ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_ci";

/** Text compared byte by byte: keys, codes, numbers of documents. */
export const EXACT = "CHARACTER SET utf8mb4 COLLATE utf8mb4_bin";

/** Keys made of ASCII only: hashes, idempotency keys. */
export const ASCII = "CHARACTER SET ascii COLLATE ascii_bin";

export const ID = "id BIGINT UNSIGNED NOT NULL AUTO_INCREMENT PRIMARY KEY";

/** Every moment is UTC: connections run in that time zone. */
export const CREATED_AT = "created_at DATETIME(3) NOT NULL DEFAULT CURRENT_TIMESTAMP(3)";
