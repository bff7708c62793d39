/** A reason to stop that the person can mend: shown as its one sentence, without a stack. */
export class StopSentence extends Error {}

/**
 * Says why the command ends. Only a fault of ours shows where it happened.
 * @param {unknown} error
 */
export function sayWhyItStops(error) {
  if (error instanceof StopSentence) console.error(error.message);
  else if (error instanceof Error) console.error(error.stack ?? error.message);
  else console.error(String(error));
}
