/** A failure that a person can act on: its message is printed alone, without a stack. */
export class Unmet extends Error {}

/** Ends the command with a message: plain for what a person can mend, with the stack for everything else. */
export function failWith(error) {
  console.error(error instanceof Unmet ? `\n${error.message}\n` : error);
  process.exit(1);
}
