/** Every quantity is stored with this many decimals, whatever its part counts in. */
export const STORED_DECIMALS = 6;

/** A stored quantity stays below this many millionths: fourteen digits before the point. */
export const STORED_LIMIT = 10n ** 20n;
