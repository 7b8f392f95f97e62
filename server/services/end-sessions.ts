import type { DataSource } from 'typeorm';
import { SessionRow } from '../entities/session-row';

/** Signs an account out on every device, at once and on the server's side. */
export async function endSessionsOf(db: DataSource, accountId: string): Promise<void> {
  await db.getRepository(SessionRow).delete({ accountId });
}
