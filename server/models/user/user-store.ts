import { Op, type InferAttributes, type ModelStatic, type Sequelize } from 'sequelize';
import { plain, plainOrNull, within } from '../rows';
import type { Unit } from '../unit-of-work';
import { defineUsers, type UserModel } from './user-model';

/** An account as stored. */
export type User = Readonly<InferAttributes<UserModel>>;

/** What may change of an account. */
export type UserChange = Partial<
  Pick<User, 'name' | 'passwordHash' | 'administrator' | 'disabled' | 'lastSignInAt'>
>;

/** Reads and writes accounts. */
export class UserStore {
  private readonly users: ModelStatic<UserModel>;

  constructor(sequelize: Sequelize) {
    this.users = defineUsers(sequelize);
  }

  async findById(id: string, unit?: Unit): Promise<User | null> {
    return plainOrNull(await this.users.findByPk(id, within(unit)));
  }

  /** Finds by address; upper and lower case are the same. */
  async findByEmail(email: string, unit?: Unit): Promise<User | null> {
    const where = { emailKey: emailKey(email) };
    return plainOrNull(await this.users.findOne({ where, ...within(unit) }));
  }

  async findMany(ids: readonly string[], unit?: Unit): Promise<readonly User[]> {
    const where = { id: { [Op.in]: [...new Set(ids)] } };
    return (await this.users.findAll({ where, ...within(unit) })).map(plain);
  }

  /** All accounts, by name. */
  async list(unit?: Unit): Promise<readonly User[]> {
    const order: [string, string][] = [
      ['name', 'ASC'],
      ['id', 'ASC'],
    ];
    return (await this.users.findAll({ order, ...within(unit) })).map(plain);
  }

  async count(unit?: Unit): Promise<number> {
    return this.users.count(within(unit));
  }

  /** How many administrators can sign in. */
  async countAdministrators(unit?: Unit): Promise<number> {
    return this.users.count({ where: { administrator: true, disabled: false }, ...within(unit) });
  }

  async insert(user: Omit<User, 'emailKey'>, unit: Unit): Promise<void> {
    await this.users.create({ ...user, emailKey: emailKey(user.email) }, within(unit));
  }

  async update(id: string, change: UserChange, unit: Unit): Promise<void> {
    await this.users.update(change, { where: { id }, ...within(unit) });
  }
}

/** The form of an address by which accounts are told apart. */
export function emailKey(email: string): string {
  return email.trim().normalize('NFKC').toLowerCase();
}
