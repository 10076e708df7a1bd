import type { InferAttributes, ModelStatic, Sequelize } from 'sequelize';
import type { CodeBook } from '#shared/code-book';
import { plain, within } from '../rows';
import type { Unit } from '../unit-of-work';
import { defineCodeBooks, type CodeBookModel } from './code-book-model';

type Row = InferAttributes<CodeBookModel>;

/** One version of a data set's code book. */
export type CodeBookVersion = Readonly<Omit<Row, 'content'>> & { readonly content: CodeBook };

/** Reads versions of code books and adds new ones; a version never changes. */
export class CodeBookStore {
  private readonly codeBooks: ModelStatic<CodeBookModel>;

  constructor(sequelize: Sequelize) {
    this.codeBooks = defineCodeBooks(sequelize);
  }

  async findById(id: string, unit?: Unit): Promise<CodeBookVersion | null> {
    return parse(await this.codeBooks.findByPk(id, within(unit)));
  }

  /** The newest version, or null when the data set has none. */
  async newest(dataSetId: string, unit?: Unit): Promise<CodeBookVersion | null> {
    const order: [string, string][] = [['number', 'DESC']];
    return parse(await this.codeBooks.findOne({ where: { dataSetId }, order, ...within(unit) }));
  }

  async insert(version: CodeBookVersion, unit: Unit): Promise<void> {
    const content = JSON.stringify(version.content);
    await this.codeBooks.create({ ...version, content }, within(unit));
  }
}

function parse(instance: CodeBookModel | null): CodeBookVersion | null {
  if (instance === null) return null;
  const row = plain(instance);
  return { ...row, content: JSON.parse(row.content) as CodeBook };
}
