import type { InferAttributes, ModelStatic, Sequelize } from 'sequelize';
import type { CutProfile } from '#shared/api';
import { plain, within } from '../rows';
import type { Unit } from '../unit-of-work';
import { defineCuts, type CutModel } from './cut-model';

type Row = InferAttributes<CutModel>;

/** A cut as stored, with what its file held. */
export type Cut = Readonly<Omit<Row, 'profile'>> & { readonly profile: CutProfile };

/** A cut that is ready or destroyed: it belongs to a data set and has a number there. */
export type NumberedCut = Cut & { readonly dataSetId: string; readonly number: number };

/** What a cut gets when it becomes ready. */
export type ReadyCut = Pick<
  NumberedCut,
  'dataSetId' | 'number' | 'dataDate' | 'profile' | 'createdAt' | 'createdBy'
>;

/** What lists of cuts leave out, since it may be large. */
type Listed = Omit<NumberedCut, 'profile'>;

const LISTED: readonly (keyof Row)[] = [
  'id',
  'dataSetId',
  'number',
  'dataDate',
  'fileName',
  'rows',
  'sha256',
  'state',
  'createdAt',
  'createdBy',
];

/** Reads and writes data cuts, from loading to ready. */
export class CutStore {
  private readonly cuts: ModelStatic<CutModel>;

  constructor(sequelize: Sequelize) {
    this.cuts = defineCuts(sequelize);
  }

  async findById(id: string, unit?: Unit): Promise<Cut | null> {
    const found = await this.cuts.findByPk(id, within(unit));
    return found === null ? null : parse(plain(found));
  }

  /** The ready cuts of a data set, oldest first. */
  async listReady(dataSetId: string, unit?: Unit): Promise<readonly Listed[]> {
    const found = await this.cuts.findAll({
      attributes: [...LISTED],
      where: { dataSetId, state: 'ready' },
      order: [['number', 'ASC']],
      ...within(unit),
    });
    return found.map(plain).flatMap((row) => {
      const { dataSetId: owner, number } = row;
      return owner === null || number === null ? [] : [{ ...row, dataSetId: owner, number }];
    });
  }

  /** Ids of the cuts that were not finished; at start nobody works on them any more. */
  async listLoading(unit?: Unit): Promise<readonly string[]> {
    const found = await this.cuts.findAll({
      attributes: ['id'],
      where: { state: 'loading' },
      ...within(unit),
    });
    return found.map(({ id }) => id);
  }

  /** The number that the next cut of a data set gets. */
  async nextNumber(dataSetId: string, unit: Unit): Promise<number> {
    const last = await this.cuts.max<number | null, CutModel>('number', {
      where: { dataSetId },
      ...within(unit),
    });
    return (last ?? 0) + 1;
  }

  async insert(cut: Cut, unit: Unit): Promise<void> {
    await this.cuts.create({ ...cut, profile: JSON.stringify(cut.profile) }, within(unit));
  }

  /** Notes what a loading cut holds, once its file was read. */
  async noteContents(
    id: string,
    { profile, ...contents }: Pick<Cut, 'rows' | 'sha256' | 'profile'>,
    unit: Unit,
  ): Promise<void> {
    const change = { ...contents, profile: JSON.stringify(profile) };
    await this.cuts.update(change, { where: { id }, ...within(unit) });
  }

  /** Makes a loading cut ready; from then on it does not change. */
  async makeReady(id: string, { profile, ...rest }: ReadyCut, unit: Unit): Promise<void> {
    const change = { ...rest, profile: JSON.stringify(profile), state: 'ready' } as const;
    await this.cuts.update(change, { where: { id, state: 'loading' }, ...within(unit) });
  }

  /** Removes a loading cut; its columns and chunks go before it. */
  async removeLoading(id: string, unit: Unit): Promise<void> {
    await this.cuts.destroy({ where: { id, state: 'loading' }, ...within(unit) });
  }
}

function parse(row: Row): Cut {
  return { ...row, profile: JSON.parse(row.profile) as CutProfile };
}
