import { openDatabase } from '../../scripts/database.mjs';
import type { DatabaseServer } from '../../scripts/database.mjs';

let server: DatabaseServer | undefined;

/** Starts the tests' own MariaDB, or joins the one that runs, for the whole of a run. */
export async function setup(): Promise<void> {
  server = await openDatabase('test-mariadb');
}

export async function teardown(): Promise<void> {
  await server?.close();
}
