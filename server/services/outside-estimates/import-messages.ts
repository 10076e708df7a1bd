import type { ImportProblem, ImportProblemCode } from '#shared/outside-estimates';
import type { Dependencies } from '../../dependencies';
import type { FieldProblem } from '../../errors/server-issue';
import { wordsOf } from './check-entry';

/** What is wrong with a line of a file of estimates, as a field problem of that line. */
export function importMessage(dependencies: Dependencies, problem: ImportProblem): FieldProblem {
  const { line, code, facts, findings = [] } = problem;
  const said = findings.map((finding) => wordsOf(dependencies, finding)).join(' ');
  const words = code === 'numbersRefused' ? said : filled(MESSAGES[code], facts);
  return { path: `lines.${String(line)}`, message: `Line ${String(line)}: ${words}` };
}

function filled(text: string, facts: Readonly<Record<string, string>>): string {
  return text.replace(/\{(\w+)\}/g, (_, name: string) => facts[name] ?? '');
}

/** Braces name facts of the problem. */
const MESSAGES: Readonly<Record<Exclude<ImportProblemCode, 'numbersRefused'>, string>> = {
  noRows: 'the file has column names but no estimate.',
  tooManyRows: 'the file has more than {most} estimates; split it.',
  columnMissing: 'there is no column “{column}”.',
  columnTwice: 'the column “{column}” comes twice.',
  columnUnknown:
    'the column “{column}” is not known here. Known are level, measure, estimate, lower, upper, ' +
    'p, confidence, method, covariates, n, source, date and note.',
  levelUnknown: '“{text}” is no exposure level of this analysis. Write its label, or all levels.',
  levelIsReference: '“{text}” is the reference level; an estimate compares another level with it.',
  measureUnknown:
    '“{text}” is no measure known here. Write risk difference, risk ratio, odds ratio, rate ' +
    'ratio or hazard ratio.',
  cellEmpty: 'the column “{column}” is empty.',
  cellTooLong: 'the text in the column “{column}” is longer than 500 characters.',
  numberNotWhole: '“{text}” in the column “{column}” is no whole number of people.',
  levelNotPercent: '“{text}” is no level of confidence. Write it as in 95%.',
  dateNotReadable: '“{text}” is no day. Write it as in 2026-05-12.',
  rowTwice: 'this level, measure and model stand in line {text} already.',
};
