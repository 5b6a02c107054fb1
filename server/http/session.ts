import { createHash } from 'node:crypto';
import session from 'express-session';
import type { RequestHandler } from 'express';

/** What the session store needs from the database; kept by the sessions repo. */
export interface SessionRows {
  read(idHash: string, now: number): string | null;
  write(row: { idHash: string; userId: number | null; data: string; expiresAt: number }): void;
  touch(idHash: string, expiresAt: number): void;
  remove(idHash: string): void;
}

export const SESSION_COOKIE = 'thenworth';
const TWO_WEEKS = 14 * 24 * 60 * 60 * 1000;

/** Only the hash of a session id is stored: a copy of the file signs nobody in. */
const hashOf = (sessionId: string) => createHash('sha256').update(sessionId).digest('hex');

class SqliteSessionStore extends session.Store {
  constructor(
    private readonly rows: SessionRows,
    private readonly now: () => number,
  ) {
    super();
  }

  override get(sessionId: string, done: (error: unknown, data?: session.SessionData | null) => void): void {
    settle(done, () => {
      const data = this.rows.read(hashOf(sessionId), this.now());
      return data === null ? null : (JSON.parse(data) as session.SessionData);
    });
  }

  override set(sessionId: string, data: session.SessionData, done?: (error?: unknown) => void): void {
    const user = (data as { passport?: { user?: number } }).passport?.user ?? null;
    settle(done, () =>
      this.rows.write({
        idHash: hashOf(sessionId),
        userId: user,
        data: JSON.stringify(data),
        expiresAt: this.expiry(data),
      }),
    );
  }

  override touch(sessionId: string, data: session.SessionData, done?: (error?: unknown) => void): void {
    settle(done, () => this.rows.touch(hashOf(sessionId), this.expiry(data)));
  }

  override destroy(sessionId: string, done?: (error?: unknown) => void): void {
    settle(done, () => this.rows.remove(hashOf(sessionId)));
  }

  private expiry(data: session.SessionData): number {
    return this.now() + (data.cookie.originalMaxAge ?? TWO_WEEKS);
  }
}

/** Runs `act` and hands its result, or its error, to express-session's callback. */
function settle<T>(done: ((error: unknown, value?: T) => void) | undefined, act: () => T): void {
  let value: T;
  try {
    value = act();
  } catch (error) {
    done?.(error);
    return;
  }
  done?.(null, value);
}

/** Sessions in the practice's own file; the cookie is HttpOnly and stays on this site. */
export function sessions(options: {
  rows: SessionRows;
  secret: string;
  secure: boolean;
  now: () => number;
}): RequestHandler {
  return session({
    name: SESSION_COOKIE,
    secret: options.secret,
    store: new SqliteSessionStore(options.rows, options.now),
    resave: false,
    saveUninitialized: false,
    rolling: true,
    cookie: { httpOnly: true, sameSite: 'lax', secure: options.secure, maxAge: TWO_WEEKS, path: '/' },
  });
}
