import { join } from 'node:path';
import { Sequelize } from 'sequelize';
import { migrate } from './migrations/migrate';
import { createStores, type Stores } from './stores';
import { createUnitOfWork, type UnitOfWork } from './unit-of-work';
import { createWriteQueue, type WriteQueue } from './write-queue';

/** The open database: its stores, and the one way to write. */
export interface Database {
  readonly stores: Stores;
  readonly unitOfWork: UnitOfWork;
  /** For writes that make their own transaction, as the session store's do. */
  readonly queue: WriteQueue;
  readonly sequelize: Sequelize;
  /** Waits for queued writes, then closes. */
  readonly close: () => Promise<void>;
}

/** Opens `evenhand.sqlite` in the data directory and brings its schema up to date. */
export async function openDatabase(dataDirectory: string): Promise<Database> {
  const sequelize = connect(join(dataDirectory, 'evenhand.sqlite'));
  await sequelize.query('PRAGMA journal_mode = WAL');
  await sequelize.query('PRAGMA busy_timeout = 5000');
  await migrate(sequelize);
  const queue = createWriteQueue();
  return {
    sequelize,
    queue,
    stores: createStores(sequelize),
    unitOfWork: createUnitOfWork(sequelize, queue),
    close: async () => {
      await queue.idle();
      await sequelize.close();
    },
  };
}

function connect(storage: string): Sequelize {
  const sequelize = new Sequelize({
    dialect: 'sqlite',
    storage,
    logging: false,
    define: { timestamps: false, underscored: true, freezeTableName: true },
  });
  sequelize.addHook('beforeQuery', askNoColumnTypes);
  return sequelize;
}

/**
 * Before each query Sequelize asks SQLite for the column types of its tables, to parse dates and
 * booleans. Rows hold neither but flags, which `plain` reads, so half of all queries are saved.
 */
function askNoColumnTypes(_options: unknown, query: unknown): void {
  (query as { options: { tableNames?: readonly string[] } }).options.tableNames = [];
}
