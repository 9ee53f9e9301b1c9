// What the commands say to the person at the terminal.

/** A failure the reader can act on: its message is a whole sentence (or several) that says what to do. */
export class Halt extends Error {
  /** @param {string} message */
  constructor(message) {
    super(message);
    this.name = 'Halt';
  }
}

/** Prints one line about a step. @param {string} line */
export const say = (line) => {
  process.stdout.write(`${line}\n`);
};

/**
 * Prints a failure and answers the exit code: sentences of ours stand alone, anything unforeseen shows where it arose.
 * @param {unknown} error
 */
export function sayFailure(error) {
  if (error instanceof Halt) process.stderr.write(`\n${error.message}\n`);
  else process.stderr.write(`\n${error instanceof Error ? (error.stack ?? error.message) : String(error)}\n`);
  return 1;
}

/** Seconds since `start` (milliseconds of `performance.now()`) with one digit. @param {number} start */
export const secondsSince = (start) => `${((performance.now() - start) / 1000).toFixed(1)} s`;
