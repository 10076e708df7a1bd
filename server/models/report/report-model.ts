import type {
  InferAttributes,
  InferCreationAttributes,
  Model,
  ModelStatic,
  Sequelize,
} from 'sequelize';
import type { ReportStage } from '#shared/report';
import type { Framing } from '#shared/wording';
import { key, optionalText, text, whole } from '../columns';

/** A report. `seq` is the number of its last step; compare and set on it guards every change. */
export interface ReportModel extends Model<
  InferAttributes<ReportModel>,
  InferCreationAttributes<ReportModel>
> {
  id: string;
  studyId: string;
  title: string;
  seq: number;
  framing: Framing;
  framingPolicy: string | null;
  houseStyleId: string;
  profile: string | null;
  stage: ReportStage;
  settingsVersion: number;
  createdAt: string;
  updatedAt: string;
  updatedBy: string | null;
  removedAt: string | null;
}

/** Binds the table of reports to a database. */
export function defineReports(sequelize: Sequelize): ModelStatic<ReportModel> {
  return sequelize.define<ReportModel>('reports', {
    id: key(),
    studyId: text(),
    title: text(),
    seq: whole(),
    framing: text(),
    framingPolicy: optionalText(),
    houseStyleId: text(),
    profile: optionalText(),
    stage: text(),
    settingsVersion: whole(),
    createdAt: text(),
    updatedAt: text(),
    updatedBy: optionalText(),
    removedAt: optionalText(),
  });
}
