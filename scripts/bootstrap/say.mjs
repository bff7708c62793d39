const begun = Date.now();

/**
 * One progress line, with the seconds since the command began.
 * @param {string} text
 */
export function say(text) {
  const seconds = ((Date.now() - begun) / 1000).toFixed(1).padStart(6);
  console.log(`${seconds} s  ${text}`);
}
