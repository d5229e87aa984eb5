import process from 'node:process';

/** Something the person in front of the screen can put right. Its message says how; no stack is shown. */
export class Remedy extends Error {
  /** @override @type {string} */
  name = 'Remedy';
}

/** Prints one plain sentence with the seconds since the script began. @param {string} sentence */
export function say(sentence) {
  process.stdout.write(`${secondsSinceStart().toFixed(1).padStart(6)} s  ${sentence}\n`);
}

export function secondsSinceStart() {
  return process.uptime();
}

/**
 * Runs a script's main function. A Remedy ends it with its sentence, any other error with its stack: that
 * one is a mistake of ours.
 *
 * @param {() => Promise<number | undefined | void>} main answers the exit code, 0 when it answers nothing
 */
export async function runScript(main) {
  try {
    process.exitCode = (await main()) ?? 0;
  } catch (error) {
    process.stderr.write(error instanceof Remedy ? `\n${error.message}\n` : `\n${describe(error)}\n`);
    process.exitCode = 1;
  }
}

/** @param {unknown} error */
function describe(error) {
  return error instanceof Error ? (error.stack ?? error.message) : String(error);
}
