import type { InferAttributes, ModelStatic, Sequelize } from 'sequelize';
import { plain, plainOrNull, within } from '../rows';
import type { Unit } from '../unit-of-work';
import { defineDataSets, type DataSetModel } from './data-set-model';

/** A data set as stored. */
export type DataSet = Readonly<InferAttributes<DataSetModel>>;

/** Reads and writes data sets. */
export class DataSetStore {
  private readonly dataSets: ModelStatic<DataSetModel>;

  constructor(sequelize: Sequelize) {
    this.dataSets = defineDataSets(sequelize);
  }

  /** Finds a data set of this study; another study's is not found. */
  async find(studyId: string, id: string, unit?: Unit): Promise<DataSet | null> {
    return plainOrNull(await this.dataSets.findOne({ where: { studyId, id }, ...within(unit) }));
  }

  /** The data sets of a study, oldest first. */
  async list(studyId: string, unit?: Unit): Promise<readonly DataSet[]> {
    const order: [string, string][] = [
      ['createdAt', 'ASC'],
      ['id', 'ASC'],
    ];
    return (await this.dataSets.findAll({ where: { studyId }, order, ...within(unit) })).map(plain);
  }

  async insert(dataSet: DataSet, unit: Unit): Promise<void> {
    await this.dataSets.create(dataSet, within(unit));
  }
}
