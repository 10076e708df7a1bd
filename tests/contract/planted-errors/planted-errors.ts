import { formulaError, type FormulaError } from './formula-error';
import { OTHER_TABLES } from './other-tables';
import { STRATA_ERRORS } from './strata';
import { TESTS } from './tests';
import { TWO_GROUPS } from './two-groups';

/** One wrong formula or more for each family of methods, by the family's name. */
export const PLANTED_ERRORS: readonly (readonly [
  family: string,
  errors: readonly FormulaError[],
])[] = Object.entries({ ...TWO_GROUPS, ...TESTS, ...STRATA_ERRORS, ...OTHER_TABLES }).map(
  ([family, rows]) => [family, rows.map(formulaError)],
);
