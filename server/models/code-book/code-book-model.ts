import type {
  InferAttributes,
  InferCreationAttributes,
  Model,
  ModelStatic,
  Sequelize,
} from 'sequelize';
import { key, text, whole } from '../columns';

/** One version of a data set's code book; immutable. `content` is a JSON `CodeBook`. */
export interface CodeBookModel extends Model<
  InferAttributes<CodeBookModel>,
  InferCreationAttributes<CodeBookModel>
> {
  id: string;
  dataSetId: string;
  number: number;
  content: string;
  createdAt: string;
  createdBy: string;
}

/** Binds the table of code books to a database. */
export function defineCodeBooks(sequelize: Sequelize): ModelStatic<CodeBookModel> {
  return sequelize.define<CodeBookModel>('code_books', {
    id: key(),
    dataSetId: text(),
    number: whole(),
    content: text(),
    createdAt: text(),
    createdBy: text(),
  });
}
