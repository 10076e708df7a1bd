import type {
  InferAttributes,
  InferCreationAttributes,
  Model,
  ModelStatic,
  Sequelize,
} from 'sequelize';
import { key, text } from '../columns';

/** The result that a report shows for an analysis. */
export interface ReportPinModel extends Model<
  InferAttributes<ReportPinModel>,
  InferCreationAttributes<ReportPinModel>
> {
  reportId: string;
  analysisId: string;
  resultId: string;
}

/** Binds the table of pins to a database. */
export function defineReportPins(sequelize: Sequelize): ModelStatic<ReportPinModel> {
  return sequelize.define<ReportPinModel>('report_pins', {
    reportId: key(),
    analysisId: key(),
    resultId: text(),
  });
}
