/** Speaks to the person at the terminal: on standard error, so that standard output stays data. */
export function say(text) {
  process.stderr.write(`${text}\n`);
}

/** A reason to stop that is for the person, not for us: printed without a stack. */
export class Stop extends Error {}

/** Runs a command's main function and turns what it throws into words and an exit code. */
export async function main(work) {
  try {
    process.exitCode = (await work()) ?? 0;
  } catch (error) {
    say(error instanceof Stop ? error.message : String(error?.stack ?? error));
    process.exitCode = 1;
  }
}
