import { Op } from "sequelize";
import { SignInAttempt } from "~/db/models/people/sign-in-attempt";
import { readRows } from "~/db/read-rows.server";
import { AppError } from "~/utils/errors";
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
  const attempt = await SignInAttempt.create({ accountKey, address, succeeded: false });
  const [row] = await readRows<{
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
  if (!accountFull && Number(row.fromAddress) <= MOST_FROM_ADDRESS) return attempt.id;
  await attempt.destroy();
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
  await SignInAttempt.update({ succeeded: true }, { where: { id } });
  const yesterday = new Date(Date.now() - 24 * 60 * 60 * 1000);
  await SignInAttempt.destroy({ where: { at: { [Op.lt]: yesterday } }, limit: 1000 });
}
