import { ConfigError } from './config';
import { UnfitDatabase } from './data-source';

/** Runs one of the program's beginnings: what a person can mend is said in a sentence, everything else with its stack. */
export function runEntry(work: () => Promise<void>): void {
  work().catch((error: unknown) => {
    const mendable = error instanceof ConfigError || error instanceof UnfitDatabase;
    process.stderr.write(`${mendable ? error.message : error instanceof Error ? error.stack : String(error)}\n`);
    process.exit(1);
  });
}
