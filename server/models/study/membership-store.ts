import type { InferAttributes, ModelStatic, Sequelize } from 'sequelize';
import type { StudyRole } from '#shared/permissions';
import { plain, plainOrNull, within } from '../rows';
import type { Unit } from '../unit-of-work';
import { defineMemberships, type MembershipModel } from './membership-model';

/** A membership as stored. */
export type Membership = Readonly<InferAttributes<MembershipModel>>;

/** Reads and writes who has which role on which study. */
export class MembershipStore {
  private readonly memberships: ModelStatic<MembershipModel>;

  constructor(sequelize: Sequelize) {
    this.memberships = defineMemberships(sequelize);
  }

  async find(studyId: string, userId: string, unit?: Unit): Promise<Membership | null> {
    const where = { studyId, userId };
    return plainOrNull(await this.memberships.findOne({ where, ...within(unit) }));
  }

  /** The members of a study, oldest first. */
  async ofStudy(studyId: string, unit?: Unit): Promise<readonly Membership[]> {
    const order: [string, string][] = [
      ['createdAt', 'ASC'],
      ['userId', 'ASC'],
    ];
    const rows = await this.memberships.findAll({ where: { studyId }, order, ...within(unit) });
    return rows.map(plain);
  }

  async ofUser(userId: string): Promise<readonly Membership[]> {
    return (await this.memberships.findAll({ where: { userId } })).map(plain);
  }

  async insert(membership: Membership, unit: Unit): Promise<void> {
    await this.memberships.create(membership, within(unit));
  }

  async setRole(studyId: string, userId: string, role: StudyRole, unit: Unit): Promise<void> {
    await this.memberships.update({ role }, { where: { studyId, userId }, ...within(unit) });
  }

  async remove(studyId: string, userId: string, unit: Unit): Promise<void> {
    await this.memberships.destroy({ where: { studyId, userId }, ...within(unit) });
  }
}
