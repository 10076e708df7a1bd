import type { Sequelize } from 'sequelize';
import { SequelizeStorage, Umzug } from 'umzug';
import { MIGRATIONS } from './index';
import type { Migration } from './migration';

/** Brings the schema up to date; gives the names of the migrations that ran. */
export async function migrate(sequelize: Sequelize): Promise<readonly string[]> {
  const umzug = new Umzug({
    migrations: MIGRATIONS.map((migration) => ({
      name: migration.name,
      up: () => runStatements(sequelize, migration),
    })),
    context: sequelize,
    storage: new SequelizeStorage({ sequelize, tableName: 'migrations' }),
    logger: undefined,
  });
  return (await umzug.up()).map(({ name }) => name);
}

async function runStatements(sequelize: Sequelize, migration: Migration): Promise<void> {
  await sequelize.transaction(async (transaction) => {
    for (const statement of migration.statements) {
      await sequelize.query(statement, { transaction });
    }
  });
}
