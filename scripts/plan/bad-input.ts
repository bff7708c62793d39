/** Bad input: sentences for standard error, each with its place. Ends the command with exit code 2. */
export class BadInput extends Error {
  constructor(readonly sentences: readonly string[]) {
    super(sentences.join("\n"));
  }
}
