import type { InferAttributes, ModelStatic, Sequelize } from 'sequelize';
import type { CutProfile, ReadingOptions } from '#shared/api';
import type { CodeBook, CodeBookDifference } from '#shared/code-book';
import { plain, within } from '../rows';
import type { Unit } from '../unit-of-work';
import { defineUploads, type UploadModel, type UploadState } from './upload-model';

type Row = InferAttributes<UploadModel>;

/** The code book to start from; `codeBookNumber` is the version it was carried over from. */
export interface UploadProposal {
  readonly codeBook: CodeBook;
  readonly differences: readonly CodeBookDifference[];
  readonly codeBookNumber: number | null;
}

/** Why an upload failed. */
export interface UploadProblem {
  readonly code: string;
  readonly message: string;
  readonly wayOut: string;
}

/** An upload as stored; `cutId` is the cut that its columns are loaded into. */
export interface Upload extends Readonly<
  Omit<Row, 'options' | 'profile' | 'proposal' | 'problem'>
> {
  readonly options: ReadingOptions;
  readonly profile: CutProfile | null;
  readonly proposal: UploadProposal | null;
  readonly problem: UploadProblem | null;
}

/** What may change in an upload. */
export type UploadChange = Partial<Omit<Upload, 'id' | 'studyId' | 'personId' | 'createdAt'>>;

/** Reads and writes files on their way to become cuts. */
export class UploadStore {
  private readonly uploads: ModelStatic<UploadModel>;

  constructor(sequelize: Sequelize) {
    this.uploads = defineUploads(sequelize);
  }

  /** Finds an upload of this study; another study's is not found. */
  async find(studyId: string, id: string, unit?: Unit): Promise<Upload | null> {
    const found = await this.uploads.findOne({ where: { studyId, id }, ...within(unit) });
    return found === null ? null : parse(plain(found));
  }

  /** The uploads of all studies that are in one of these states, oldest first. */
  async listInState(states: readonly UploadState[], unit?: Unit): Promise<readonly Upload[]> {
    const found = await this.uploads.findAll({
      where: { state: [...states] },
      order: [['createdAt', 'ASC']],
      ...within(unit),
    });
    return found.map((row) => parse(plain(row)));
  }

  async insert(upload: Upload, unit: Unit): Promise<void> {
    await this.uploads.create(serialize(upload), within(unit));
  }

  /** Changes an upload that is still in this state; tells whether it was. */
  async update(id: string, state: UploadState, change: UploadChange, unit: Unit): Promise<boolean> {
    const where = { id, state };
    const [changed] = await this.uploads.update(serialize(change), { where, ...within(unit) });
    return changed === 1;
  }

  async remove(id: string, unit: Unit): Promise<void> {
    await this.uploads.destroy({ where: { id }, ...within(unit) });
  }
}

function parse(row: Row): Upload {
  return {
    ...row,
    options: JSON.parse(row.options) as ReadingOptions,
    profile: parseOrNull(row.profile) as CutProfile | null,
    proposal: parseOrNull(row.proposal) as UploadProposal | null,
    problem: parseOrNull(row.problem) as UploadProblem | null,
  };
}

function parseOrNull(json: string | null): unknown {
  return json === null ? null : JSON.parse(json);
}

const JSON_COLUMNS = ['options', 'profile', 'proposal', 'problem'] as const;

type JsonColumn = (typeof JSON_COLUMNS)[number];

/** The part with its JSON columns as text. */
type AsRow<Part extends UploadChange> = Omit<Part, JsonColumn> & Pick<Row, keyof Part & JsonColumn>;

function serialize<Part extends UploadChange>(part: Part): AsRow<Part> {
  const entries = JSON_COLUMNS.flatMap((column) => {
    const value = part[column];
    if (value === undefined) return [];
    return [[column, value === null ? null : JSON.stringify(value)]];
  });
  return { ...part, ...(Object.fromEntries(entries) as Pick<Row, keyof Part & JsonColumn>) };
}
