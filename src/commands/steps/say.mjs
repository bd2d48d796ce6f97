/**
 * A progress line for the person at the terminal.
 * @param {string} line
 */
export function say(line) {
  process.stdout.write(`${line}\n`);
}
