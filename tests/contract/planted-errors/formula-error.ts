import type { PlantedError } from '../../builders/bundled-specs';

/** A wrong formula, and the spec files of reference values that have to refuse it. */
export interface FormulaError extends PlantedError {
  readonly method: string;
  readonly specs: readonly string[];
}

/** What it takes to write one down: the module within `shared`, the right and the wrong text. */
export type Row = readonly [
  method: string,
  module: string,
  spec: string,
  text: string,
  wrong: string,
];

/** The wrong formula that a row states. */
export function formulaError([method, module, spec, text, wrong]: Row): FormulaError {
  const specs = [`tests/reference-values/${spec}.spec.ts`];
  return { method, file: `shared/${module}.ts`, specs, text, wrong };
}
