import { createHash } from 'node:crypto';
import { Store, type SessionData } from 'express-session';
import type { DataSource } from 'typeorm';
import { SessionEntity } from '../db/entities/session.entity.js';
import type { Clock } from './context.js';

type Done = (error?: unknown) => void;

/** A session that goes on is written down again once in so long, not with every call. */
const TOUCH_EVERY_MS = 60_000;
const REMEMBERED_MAX = 10_000;

/** Sessions in MariaDB. Rows know their person, so that all of a person's sessions can be ended at once. */
export class SessionStore extends Store {
  /** Until when sessions hold, as this process last wrote it. */
  private readonly written = new Map<string, number>();

  constructor(
    private readonly dataSource: DataSource,
    private readonly clock: Clock,
  ) {
    super();
  }

  override get(sid: string, done: (error: unknown, session?: SessionData | null) => void): void {
    this.rows
      .findOne({ where: { sidHash: sessionHash(sid) } })
      .then((row) => {
        const alive = row !== null && row.expiresAt > this.clock.now();
        done(null, alive ? (JSON.parse(row.data) as SessionData) : null);
      })
      .catch((error: unknown) => {
        done(error);
      });
  }

  override set(sid: string, session: SessionData, done: Done = ignore): void {
    const lifetimeMs = session.cookie.originalMaxAge ?? 0;
    const row = {
      sidHash: sessionHash(sid),
      personId: personIdOf(session),
      cardId: session.card?.id ?? null,
      data: JSON.stringify(session),
      expiresAt: new Date(this.clock.now().getTime() + lifetimeMs),
    };
    settle(this.rows.upsert(row, ['sidHash']), done);
  }

  override destroy(sid: string, done: Done = ignore): void {
    this.written.delete(sessionHash(sid));
    settle(this.rows.delete({ sidHash: sessionHash(sid) }), done);
  }

  /** Only a row that is still there: a request on its way must not bring an ended session back. */
  override touch(sid: string, session: SessionData, done: Done = ignore): void {
    const expiresAt = new Date(this.clock.now().getTime() + (session.cookie.originalMaxAge ?? 0));
    const sidHash = sessionHash(sid);
    if (Math.abs(expiresAt.getTime() - (this.written.get(sidHash) ?? 0)) < TOUCH_EVERY_MS) {
      done();
      return;
    }
    if (this.written.size >= REMEMBERED_MAX) this.written.clear();
    this.written.set(sidHash, expiresAt.getTime());
    const touched = this.rows.update({ sidHash }, { expiresAt });
    // The answer is ready by now; a touch that fails only ends the session sooner.
    settle(
      touched.catch(() => undefined),
      done,
    );
  }

  private get rows() {
    return this.dataSource.getRepository(SessionEntity);
  }
}

/** What the browser holds opens a session; what the table holds does not. */
export function sessionHash(sid: string): string {
  return createHash('sha256').update(sid).digest('hex');
}

function personIdOf(session: SessionData): string | null {
  return (session as SessionData & { passport?: { user?: string } }).passport?.user ?? null;
}

function settle(work: Promise<unknown>, done: Done): void {
  work.then(
    () => {
      done();
    },
    (error: unknown) => {
      done(error);
    },
  );
}

function ignore(): void {
  // express-session may call without a callback
}
