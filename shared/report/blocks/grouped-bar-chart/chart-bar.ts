import { layerAt, numberOf, readValue } from '#shared/analysis';
import type {
  AddressedQuantity,
  AddressFacet,
  AnalysisResult,
  ResultScope,
  ValueAddress,
} from '#shared/analysis';
import { countsOnlyMark, formatCount, formatShare } from '#shared/format';
import type { HouseStyle } from '#shared/house-style';
import type { ChartBar } from '#shared/layout';
import type { GroupCount } from '#shared/stats';

/** Which share a bar shows. */
export interface BarPlace {
  readonly groupId: string;
  readonly levelId: string;
  readonly scope: ResultScope;
  readonly quantity: 'risk' | 'shareOfCases' | 'shareOfControls';
}

/** What every bar of a chart is made under. */
export interface ChartSetting {
  readonly analysisId: string;
  readonly result: AnalysisResult;
  readonly houseStyle: HouseStyle;
  readonly decimals: number;
}

/**
 * One bar. Its value prints as the table prints it; a group that is empty, or so small that the
 * house style shows counts only, has no bar and prints the mark that the table prints.
 */
export function chartBar(place: BarPlace, setting: ChartSetting): ChartBar {
  const { result, houseStyle, decimals } = setting;
  const count = COUNTS[place.quantity](place, result);
  const share = formatShare(count, decimals, houseStyle);
  const limit = (facet: AddressFacet): number | null =>
    share === null ? null : numberAt(addressOf(place, setting, facet), result);
  return {
    categoryId: place.levelId,
    groupId: place.groupId,
    events: count.events,
    total: count.total,
    totalText: formatCount(count.total, houseStyle).text,
    value: share?.value ?? null,
    lower: limit('lower'),
    upper: limit('upper'),
    valueText: share?.text ?? markOf(count, houseStyle),
    addresses: [
      ...(share === null ? [] : [addressOf(place, setting, 'value')]),
      totalAddress(place, setting),
    ],
  };
}

function markOf({ total }: GroupCount, style: HouseStyle): string {
  return total === 0 ? style.table.missingCell.mark : countsOnlyMark(style);
}

const COUNTS: Readonly<
  Record<BarPlace['quantity'], (place: BarPlace, result: AnalysisResult) => GroupCount>
> = {
  risk: groupAt,
  shareOfCases: (place, result) => ({
    events: groupAt(place, result).events,
    total: wholeAt(place, result).events,
  }),
  shareOfControls: (place, result) => ({
    events: othersOf(groupAt(place, result)),
    total: othersOf(wholeAt(place, result)),
  }),
};

const TOTALS = {
  risk: 'total',
  shareOfCases: 'events',
  shareOfControls: 'controls',
} as const satisfies Readonly<Record<BarPlace['quantity'], AddressedQuantity>>;

/** A bar's n is its own group's, or all cases, or all controls. */
function totalAddress(
  { quantity, levelId, scope }: BarPlace,
  { analysisId }: ChartSetting,
): ValueAddress {
  const ofGroup = quantity === 'risk' ? levelId : null;
  return { analysisId, quantity: TOTALS[quantity], levelId: ofGroup, scope, facet: 'value' };
}

const NOBODY: GroupCount = { events: 0, total: 0 };

function groupAt({ levelId, scope }: BarPlace, result: AnalysisResult): GroupCount {
  const layer = layerAt(result, scope);
  return layer?.levels.find((level) => level.levelId === levelId)?.count ?? NOBODY;
}

function wholeAt({ scope }: BarPlace, result: AnalysisResult): GroupCount {
  return layerAt(result, scope)?.total ?? NOBODY;
}

function othersOf({ events, total }: GroupCount): number {
  return total - events;
}

function numberAt(address: ValueAddress, result: AnalysisResult): number | null {
  const read = readValue(result, address);
  return read.ok ? numberOf(read.value) : null;
}

function addressOf(
  { quantity, levelId, scope }: BarPlace,
  { analysisId }: ChartSetting,
  facet: AddressFacet,
): ValueAddress {
  return { analysisId, quantity, levelId, scope, facet };
}
