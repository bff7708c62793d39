const hidden = /[\p{Cc}\p{Cf}\p{Cs}\p{Zl}\p{Zp}]/u;
const hiddenButBreaks = /(?![\n\t])[\p{Cc}\p{Cs}]/u;

/** Control, format and lone surrogate characters: nothing that a person could see or type on purpose. */
export function hasHiddenCharacter(text: string): boolean {
  return hidden.test(text);
}

/** The same for longer text, where line breaks, tabs and joiners are ordinary. */
export function hasControlCharacter(text: string): boolean {
  return hiddenButBreaks.test(text);
}
