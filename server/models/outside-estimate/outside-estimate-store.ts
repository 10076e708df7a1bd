import type { InferAttributes, ModelStatic, Sequelize } from 'sequelize';
import type { OutsideEstimate, OutsideEstimateEntry } from '#shared/outside-estimates';
import { plain, within } from '../rows';
import type { Unit } from '../unit-of-work';
import { defineOutsideEstimates, type OutsideEstimateModel } from './outside-estimate-model';

/** An estimate from elsewhere as it is written. */
export type StoredOutsideEstimate = Readonly<
  Omit<InferAttributes<OutsideEstimateModel>, 'entry' | 'removedAt'>
> & { readonly entry: OutsideEstimateEntry };

/** What a change writes. */
export type OutsideEstimateChange = Pick<
  StoredOutsideEstimate,
  'version' | 'entry' | 'personId' | 'updatedAt'
>;

const BY_ENTRY: [string, string][] = [
  ['createdAt', 'ASC'],
  ['id', 'ASC'],
];

/** Reads and writes estimates from elsewhere; a removed one stays, for the record. */
export class OutsideEstimateStore {
  private readonly estimates: ModelStatic<OutsideEstimateModel>;

  constructor(sequelize: Sequelize) {
    this.estimates = defineOutsideEstimates(sequelize);
  }

  /** The estimates beside these analyses, in the order in which they were entered. */
  async ofAnalyses(
    analysisIds: readonly string[],
    unit?: Unit,
  ): Promise<readonly OutsideEstimate[]> {
    const where = { analysisId: [...analysisIds], removedAt: null };
    const rows = await this.estimates.findAll({ where, order: BY_ENTRY, ...within(unit) });
    return rows.map(parse);
  }

  /** Finds an estimate beside an analysis of this study. */
  async find(
    place: Pick<OutsideEstimate, 'studyId' | 'analysisId' | 'id'>,
    unit?: Unit,
  ): Promise<OutsideEstimate | null> {
    const where = { ...place, removedAt: null };
    const row = await this.estimates.findOne({ where, ...within(unit) });
    return row === null ? null : parse(row);
  }

  async insert(estimate: StoredOutsideEstimate, unit: Unit): Promise<void> {
    const entry = JSON.stringify(estimate.entry);
    await this.estimates.create({ ...estimate, entry, removedAt: null }, within(unit));
  }

  /** Changes the estimate if it still has this version; says whether it had. */
  async update(
    id: string,
    version: number,
    change: OutsideEstimateChange,
    unit: Unit,
  ): Promise<boolean> {
    const where = { id, version, removedAt: null };
    const written = { ...change, entry: JSON.stringify(change.entry) };
    const [changed] = await this.estimates.update(written, { where, ...within(unit) });
    return changed === 1;
  }

  async remove(id: string, removedAt: string, unit: Unit): Promise<void> {
    await this.estimates.update({ removedAt }, { where: { id }, ...within(unit) });
  }
}

function parse(instance: OutsideEstimateModel): OutsideEstimate {
  const { id, studyId, analysisId, version, entry } = plain(instance);
  return { ...(JSON.parse(entry) as OutsideEstimateEntry), id, studyId, analysisId, version };
}
