import type { ModelStatic, Sequelize } from 'sequelize';
import { Op } from 'sequelize';
import { within } from '../rows';
import type { Unit } from '../unit-of-work';
import { defineSessions, type SessionModel } from './session-model';

/** Ends sessions; the session store of `session/` writes them. */
export class SessionStore {
  private readonly sessions: ModelStatic<SessionModel>;

  constructor(sequelize: Sequelize) {
    this.sessions = defineSessions(sequelize);
  }

  /** Ends every session of a person, or all but the one that is named. */
  async endAllOf(userId: string, keep: string | null, unit: Unit): Promise<void> {
    const others = keep === null ? {} : { sid: { [Op.ne]: keep } };
    await this.sessions.destroy({ where: { userId, ...others }, ...within(unit) });
  }

  async countOf(userId: string): Promise<number> {
    return this.sessions.count({ where: { userId } });
  }

  async count(): Promise<number> {
    return this.sessions.count();
  }

  /** Writes the data of a session that still exists; one that has ended stays ended. */
  async updateExisting(sid: string, data: string, expires: Date): Promise<void> {
    await this.sessions.update({ data, expires }, { where: { sid } });
  }
}
