import connectPgSimple from 'connect-pg-simple';
import session from 'express-session';

const TEN_MINUTES = 10 * 60 * 1000;

/**
 * Sessions in PostgreSQL, put off at most once in ten minutes: a map asks for dozens of tiles at a time,
 * and a session that nobody uses may end ten minutes early.
 */
export class SessionStore extends connectPgSimple(session) {
  /** When sessions were put off last, the longest ago first. */
  readonly #putOff = new Map<string, number>();

  override touch(id: string, data: session.SessionData, done?: () => void): void {
    const now = Date.now();
    for (const [other, at] of this.#putOff) {
      if (now - at < TEN_MINUTES) break;
      this.#putOff.delete(other);
    }
    if (this.#putOff.has(id)) {
      done?.();
      return;
    }
    this.#putOff.set(id, now);
    super.touch(id, data, done);
  }
}
