import { Op, type InferAttributes, type ModelStatic, type Sequelize } from 'sequelize';
import type { Step } from '#shared/report';
import { plain, within } from '../rows';
import type { Unit } from '../unit-of-work';
import { defineSteps, type StepModel } from './step-model';

type Row = InferAttributes<StepModel>;

/** An accepted step: what it does, and what takes it back. */
export type StoredStep = Readonly<Omit<Row, 'forward' | 'inverse'>> & {
  readonly forward: Step;
  readonly inverse: Step;
};

/** Reads steps and adds new ones; a step never changes. */
export class StepStore {
  private readonly steps: ModelStatic<StepModel>;

  constructor(sequelize: Sequelize) {
    this.steps = defineSteps(sequelize);
  }

  /** The steps after number `seq`, oldest first, at most `limit`. */
  async after(reportId: string, seq: number, limit: number): Promise<readonly StoredStep[]> {
    const where = { reportId, seq: { [Op.gt]: seq } };
    const order: [string, string][] = [['seq', 'ASC']];
    return (await this.steps.findAll({ where, order, limit })).map(parse);
  }

  /** The steps before number `seq`, newest first, at most `limit`. */
  async before(
    reportId: string,
    seq: number,
    limit: number,
    unit: Unit,
  ): Promise<readonly StoredStep[]> {
    const where = { reportId, seq: { [Op.lt]: seq } };
    const order: [string, string][] = [['seq', 'DESC']];
    return (await this.steps.findAll({ where, order, limit, ...within(unit) })).map(parse);
  }

  /** The steps of a report that have these ids. */
  async findMany(
    reportId: string,
    ids: readonly string[],
    unit: Unit,
  ): Promise<readonly StoredStep[]> {
    const where = { reportId, id: [...ids] };
    return (await this.steps.findAll({ where, ...within(unit) })).map(parse);
  }

  async insert(step: StoredStep, unit: Unit): Promise<void> {
    const forward = JSON.stringify(step.forward);
    const inverse = JSON.stringify(step.inverse);
    await this.steps.create({ ...step, forward, inverse }, within(unit));
  }
}

function parse(instance: StepModel): StoredStep {
  const row = plain(instance);
  return {
    ...row,
    forward: JSON.parse(row.forward) as Step,
    inverse: JSON.parse(row.inverse) as Step,
  };
}
