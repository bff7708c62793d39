/**
 * Stands where a person has not chosen a password yet. It has the shape of a hash at the usual cost, so comparing takes
 * as long as with any other, and fits nothing: 23 bytes end in one of sixteen letters, of which `/` is none.
 */
export const NO_PASSWORD = `$2b$11$${".".repeat(52)}/`;
