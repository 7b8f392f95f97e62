import { createHash } from 'node:crypto';
import { Store } from 'express-session';
import type { SessionData } from 'express-session';
import { SessionRow } from '../entities/session-row';
import type { AppDeps } from '../services/deps';

declare module 'express-session' {
  interface SessionData {
    passport?: { user: string };
    /** when this session last had the password, ISO 8601 */
    passwordAt?: string;
    userAgent?: string;
    /** its name in the list of devices; set by the store on what it has read, so that only a new session is inserted */
    handle?: string;
  }
}

type Done = (error?: unknown) => void;

/** Being seen is written down this often at most: reading a screen costs no write. */
const seenEveryMs = 60_000;

const keyOf = (sid: string) => createHash('sha256').update(sid).digest('hex');

/** Sessions in MariaDB, with idle and absolute limits kept by the server's clock whatever the cookie says. */
export class SessionStore extends Store {
  constructor(private readonly deps: Pick<AppDeps, 'dataSource' | 'config' | 'clock' | 'ids'>) {
    super();
  }

  private get rows() {
    return this.deps.dataSource.getRepository(SessionRow);
  }

  override get(sid: string, done: (error: unknown, session?: SessionData | null) => void): void {
    this.read(keyOf(sid)).then((session) => done(null, session), done);
  }

  private async read(id: string): Promise<SessionData | null> {
    const row = await this.rows.findOneBy({ id });
    if (!row) return null;
    const { idleMs, longestMs } = this.deps.config.session;
    const now = this.deps.clock().getTime();
    if (now - row.seenAt.getTime() >= idleMs || now - row.createdAt.getTime() >= longestMs) {
      await this.rows.delete({ id });
      return null;
    }
    return { ...(JSON.parse(row.data) as SessionData), handle: row.handle };
  }

  override set(sid: string, session: SessionData, done: Done = () => undefined): void {
    this.write(keyOf(sid), session).then(() => done(), done);
  }

  /** One that was read and has been ended meanwhile stays ended: it is updated, never put back. */
  private async write(id: string, { handle, ...kept }: SessionData): Promise<void> {
    const data = JSON.stringify(kept);
    if (handle !== undefined) return void (await this.rows.update({ id }, { data }));
    const accountId = kept.passport?.user;
    if (accountId === undefined) return;
    const now = this.deps.clock();
    const userAgent = (kept.userAgent ?? '').slice(0, 200);
    const row = { id, handle: this.deps.ids(), accountId, data, userAgent, createdAt: now, seenAt: now };
    await this.rows.createQueryBuilder().insert().values(row).orUpdate(['data', 'user_agent'], ['id']).execute();
  }

  override destroy(sid: string, done: Done = () => undefined): void {
    this.rows.delete({ id: keyOf(sid) }).then(() => done(), done);
  }

  override touch(sid: string, _session: SessionData, done: Done = () => undefined): void {
    const seenAt = this.deps.clock();
    this.rows
      .createQueryBuilder()
      .update()
      .set({ seenAt })
      .where('id = :id AND seen_at < :before', { id: keyOf(sid), before: new Date(seenAt.getTime() - seenEveryMs) })
      .execute()
      .then(() => done(), done);
  }
}
