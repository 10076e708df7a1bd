import type { BalanceGauge, GaugeEdge } from '#shared/wording';

/** A tick on an edge; `label` is null between the named ones. */
export interface GaugeTick {
  /** In the unit of the gauge: a share of people, or a multiple. */
  readonly at: number;
  readonly label: string | null;
}

/** The two edges of a gauge, from zero to `end`. */
export interface GaugeScale {
  readonly end: number;
  /** Empty where the design gives no risks. */
  readonly people: readonly GaugeTick[];
  /** Empty where there is no reference to be multiplied. */
  readonly multiples: readonly GaugeTick[];
}

const STEPS = [1, 2, 5];
const SMALLS_PER_LABEL = 5;
/** A limit further out than this many bars would squeeze the bar; it gets an arrow instead. */
const MOST_BARS = 4;
const PEOPLE = 100;
const WIDEST_STEP_NAMING_ONE = 5;

/** How far a scale must reach, and how many named ticks have room on an edge. */
export interface ScaleRoom {
  readonly end: number;
  readonly mostLabels: number;
}

/** The scale of a gauge: from zero to the next named tick past the end that is asked for. */
export function gaugeScale(gauge: BalanceGauge, room: ScaleRoom): GaugeScale {
  switch (gauge.kind) {
    case 'risks':
      return risksScale(gauge.referenceRisk, room);
    case 'ratio':
      return ratioScale(room);
  }
}

/** The far end that every gauge of a list fits on: rows that are compared share one scale. */
export function commonEnd(gauges: readonly BalanceGauge[]): number {
  return Math.max(...gauges.map(furthest));
}

function risksScale(referenceRisk: number, { end, mostLabels }: ScaleRoom): GaugeScale {
  const step = labelStep(end * PEOPLE, mostLabels);
  const rounded = Math.ceil(round((end * PEOPLE) / step)) * step;
  const last = Math.min(rounded, PEOPLE) / PEOPLE;
  return {
    end: last,
    people: ticks(last * PEOPLE, step, step / SMALLS_PER_LABEL, peopleLabel).map((tick) => ({
      ...tick,
      at: tick.at / PEOPLE,
    })),
    multiples: referenceRisk > 0 ? multiplesOf(referenceRisk, last, mostLabels) : [],
  };
}

function ratioScale({ end, mostLabels }: ScaleRoom): GaugeScale {
  const step = Math.max(1, labelStep(end, mostLabels));
  const last = Math.ceil(round(end / step)) * step;
  return { end: last, people: [], multiples: multiplesOf(1, last, mostLabels) };
}

function multiplesOf(reference: number, end: number, mostLabels: number): readonly GaugeTick[] {
  const step = Math.max(1, labelStep(end / reference, mostLabels));
  return namingOne(ticks(end / reference, step, step / 2, multipleLabel)).map((tick) => ({
    ...tick,
    at: tick.at * reference,
  }));
}

/** The reference itself is named too, unless its name would touch that of zero. */
function namingOne(found: readonly GaugeTick[]): readonly GaugeTick[] {
  const [zero, ...others] = found;
  const step = others.find(({ label }) => label !== null)?.at ?? 1;
  if (zero === undefined || step > WIDEST_STEP_NAMING_ONE) return found;
  const beyond = others.filter(({ at }) => at !== 1);
  return [zero, ...beyond, { at: 1, label: multipleLabel(1) }].toSorted(
    (one, other) => one.at - other.at,
  );
}

function ticks(
  end: number,
  labelled: number,
  small: number,
  label: (value: number) => string,
): readonly GaugeTick[] {
  const everyNth = Math.round(labelled / small);
  return Array.from({ length: Math.floor(round(end / small)) + 1 }, (_, index) => {
    const at = round(index * small);
    return { at, label: index % everyNth === 0 ? label(at) : null };
  });
}

/** The smallest of 1, 2, 5, 10 … (and their tenths) that needs few labels. */
function labelStep(span: number, mostLabels: number): number {
  const power = 10 ** Math.floor(Math.log10(span / mostLabels));
  const step = STEPS.find((each) => span / (each * power) <= mostLabels) ?? 10;
  return round(step * power);
}

/** The far end of what a gauge shows. */
export function furthest(gauge: BalanceGauge): number {
  switch (gauge.kind) {
    case 'risks':
      return reach([gauge.referenceRisk], [gauge.absolute, gauge.relative]);
    case 'ratio':
      return reach([1], [gauge.relative]);
  }
}

function reach(bars: readonly number[], edges: readonly (GaugeEdge | null)[]): number {
  const known = edges.filter((edge) => edge !== null);
  const longest = Math.max(...bars, ...known.map(({ value }) => value), 1e-6);
  const limits = known.map(({ upper }) => Math.min(upper, longest * MOST_BARS));
  return Math.max(longest, ...limits);
}

function peopleLabel(value: number): string {
  return value === 0 ? '0 in 100' : String(value);
}

function multipleLabel(value: number): string {
  return value === 0 ? '0' : `${value}×`;
}

/** Takes away what binary fractions add in the last digits. */
function round(value: number): number {
  return Number(value.toPrecision(12));
}
