/** Sessions in the shop's own database; its writes wait their turn with all others. */
import connectSessionSequelize from 'connect-session-sequelize';
import session, { type SessionData } from 'express-session';
import { Op } from 'sequelize';
import type { Database } from '../models/database';
import { SESSION_MODEL } from '../models/sessions';

const SequelizeStore = connectSessionSequelize(session.Store);

type Done = (error?: unknown) => void;

export class SessionStore extends SequelizeStore {
  readonly #database: Database;

  constructor(database: Database) {
    const options = {
      db: database.sequelize,
      table: SESSION_MODEL,
      checkExpirationInterval: 15 * 60 * 1000,
      // A request that only reads must not write; session.ts renews a session now and then instead.
      disableTouch: true,
    };
    super(options);
    this.#database = database;
  }

  override set(sid: string, data: SessionData, done: Done = () => undefined): void {
    this.#inTurn(done, async () => {
      // A renewal that was under way while its owner signed out must not bring the session back.
      if (data.renewedAt !== data.signedInAt && (await this.#database.sessions.count({ where: { sid } })) === 0) return;
      await new Promise<void>((resolve, reject) => {
        super.set(sid, data, (error?: unknown) => (error ? reject(asError(error)) : resolve()));
      });
    });
  }

  override destroy(sid: string, done: Done = () => undefined): void {
    this.#inTurn(done, () => this.#database.sessions.destroy({ where: { sid } }));
  }

  /** The library's own clock calls this every quarter of an hour; what can't be swept now is swept then. */
  clearExpiredSessions(done: Done = () => undefined): void {
    this.#inTurn(done, () => this.#database.sessions.destroy({ where: { expires: { [Op.lt]: new Date() } } }));
  }

  #inTurn(done: Done, work: () => Promise<unknown>): void {
    this.#database.inTurn(work).then(() => done(), done);
  }
}

const asError = (error: unknown): Error => (error instanceof Error ? error : new Error(String(error)));
