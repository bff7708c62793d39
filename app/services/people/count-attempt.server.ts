import { AppError } from "~/utils/errors";
import { insert, run, select } from "./run-sql.server";
import { hashSecret } from "./secret.server";

const MINUTES = 15;
const MOST_FOR_ACCOUNT = 10;
const MOST_FROM_ADDRESS = 60;

interface Try {
  /** What is tried: an e-mail address in small letters, or the set-up code. */
  account: string;
  /** Where from. */
  address: string;
}

/**
 * Counts a try before it is made, in the database, since several web processes may stand beside each other.
 * A refused try does not count, so nobody stays shut out by going on.
 * @returns the number of the try, for `forgiveAttempt`
 * @throws AppError `too-many` after 10 failures for the account or 60 from the address within 15 minutes
 */
export async function countAttempt({ account, address }: Try): Promise<number> {
  const accountKey = hashSecret(account);
  const attempt = await insert(
    "INSERT INTO sign_in_attempt (account_key, address, succeeded) VALUES (:accountKey, :address, FALSE)",
    { accountKey, address },
  );
  const [row] = await select<{
    ofAccount: number;
    fromAddress: number;
    waitAccount: number;
    waitAddress: number;
  }>(
    `SELECT COALESCE(SUM(account_key = :accountKey), 0) AS ofAccount, COALESCE(SUM(address = :address), 0) AS fromAddress,
            TIMESTAMPDIFF(SECOND, NOW(3), MIN(CASE WHEN account_key = :accountKey THEN at END) + INTERVAL ${MINUTES} MINUTE) AS waitAccount,
            TIMESTAMPDIFF(SECOND, NOW(3), MIN(CASE WHEN address = :address THEN at END) + INTERVAL ${MINUTES} MINUTE) AS waitAddress
       FROM sign_in_attempt
      WHERE (account_key = :accountKey OR address = :address) AND NOT succeeded
        AND at > NOW(3) - INTERVAL ${MINUTES} MINUTE`,
    { accountKey, address },
  );
  const accountFull = Number(row.ofAccount) > MOST_FOR_ACCOUNT;
  if (!accountFull && Number(row.fromAddress) <= MOST_FROM_ADDRESS) return attempt;
  await run("DELETE FROM sign_in_attempt WHERE id = :id", { id: attempt });
  const seconds = Math.max(1, Number(accountFull ? row.waitAccount : row.waitAddress) + 1);
  const minutes = Math.ceil(seconds / 60);
  throw new AppError(
    "too-many",
    `Too many tries. Wait ${minutes === 1 ? "a minute" : `${minutes} minutes`}, then try again.`,
    { retryAfter: seconds },
  );
}

/** Marks a try as a success, and clears away what is too old to count. */
export async function forgiveAttempt(id: number): Promise<void> {
  await run("UPDATE sign_in_attempt SET succeeded = TRUE WHERE id = :id", { id });
  await run("DELETE FROM sign_in_attempt WHERE at < NOW(3) - INTERVAL 1 DAY LIMIT 1000");
}
