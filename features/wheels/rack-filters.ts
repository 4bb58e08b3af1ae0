import { dayWords, readDate } from '@/features/records';
import type { QuantitySpec } from '@/features/forms';
import { LIMITS, TEXT_LIMITS } from '@/shared/domain/limits';
import type { UnitSystem } from '@/shared/domain/people';
import { ABRASIVES, WHEEL_STATES } from '@/shared/domain/wheels';
import { formatQuantity } from '@/shared/units/format';

import type { WheelSearch } from './queries';
import { STATE_WORDS } from './words';

/** The parts of the rack's address, all of them texts. */
export type RackAddress = Readonly<Record<string, string | undefined>>;

export const FILTER_SPECS = {
  diameterFromMm: { label: 'At least', unit: 'mm', limit: 'wheelDiameterMm' },
  diameterToMm: { label: 'At most', unit: 'mm', limit: 'wheelDiameterMm' },
  limitFromRpm: {
    label: 'Limit at least',
    hint: 'The lowest of what is marked on the wheel.',
    unit: 'rpm',
    limit: 'wheelRpm',
  },
} as const satisfies Record<string, QuantitySpec>;

export const SORTS = [
  { value: 'tag', label: 'Tag', sort: 'tag', order: 'up' },
  { value: 'due', label: 'Due first', sort: 'due', order: 'up' },
  { value: 'latest', label: 'Changed last', sort: 'latest', order: 'up' },
  { value: 'smallest', label: 'Smallest first', sort: 'diameter', order: 'up' },
  { value: 'largest', label: 'Largest first', sort: 'diameter', order: 'down' },
] as const;
export type SortName = (typeof SORTS)[number]['value'];

const known = <Value extends string>(values: readonly Value[], text: string | undefined) =>
  values.find((value) => value === text);

function numberIn({ min, max }: { min: number; max: number }, text: string | undefined) {
  const value = Number(text);
  return text && Number.isFinite(value) && value >= min && value <= max ? value : undefined;
}

/** What the rack's address asks for; a part that says nothing is left out, never sent. */
export function searchOf(address: RackAddress): WheelSearch {
  const grain = numberIn({ min: 1, max: 9999 }, address.grain);
  const sort = SORTS.find(({ value }) => value === address.sort);
  const search: WheelSearch = {
    search: address.search?.trim().slice(0, TEXT_LIMITS.marking) || undefined,
    usable: address.usable === 'yes' ? 'yes' : undefined,
    state: known(WHEEL_STATES, address.state),
    abrasive: known(ABRASIVES, address.abrasive),
    grain: grain !== undefined && Number.isInteger(grain) ? grain : undefined,
    diameterFromMm: numberIn(LIMITS.wheelDiameterMm, address.diameterFromMm),
    diameterToMm: numberIn(LIMITS.wheelDiameterMm, address.diameterToMm),
    limitFromRpm: numberIn(LIMITS.wheelRpm, address.limitFromRpm),
    dueBy: readDate(address.dueBy ?? '') ?? undefined,
    place: address.place?.trim().slice(0, TEXT_LIMITS.place) || undefined,
    ...(sort && sort.value !== 'tag' ? { sort: sort.sort, order: sort.order } : {}),
  };
  return Object.fromEntries(
    Object.entries(search).filter(([, value]) => value !== undefined),
  ) as WheelSearch; // fromEntries forgets the keys
}

export const FILTER_GROUPS = [
  'usable',
  'state',
  'abrasive',
  'grain',
  'diameter',
  'limit',
  'due',
  'place',
] as const;
export type FilterGroup = (typeof FILTER_GROUPS)[number];

export const GROUP_LABELS: Record<FilterGroup, string> = {
  usable: 'Usable now',
  state: 'State',
  abrasive: 'Abrasive',
  grain: 'Grain',
  diameter: 'Diameter now',
  limit: 'Limit',
  due: 'Due',
  place: 'Place',
};

/** The parts of the address that a group sets, and that removing its chip clears. */
export const GROUP_KEYS: Record<FilterGroup, readonly string[]> = {
  usable: ['usable'],
  state: ['state'],
  abrasive: ['abrasive'],
  grain: ['grain'],
  diameter: ['diameterFromMm', 'diameterToMm'],
  limit: ['limitFromRpm'],
  due: ['dueBy'],
  place: ['place'],
};

export interface FilterReader {
  units: UnitSystem;
  /** ISO date of the shop. */
  today: string;
}

/** What a filter asks for, for its chip; null where it asks for nothing. */
export function filterWords(
  group: FilterGroup,
  search: WheelSearch,
  { units, today }: FilterReader,
): string | null {
  const { state, abrasive, grain, diameterFromMm, diameterToMm, limitFromRpm, dueBy } = search;
  const size = (value: number) => formatQuantity({ value, unit: 'mm' }, units);
  switch (group) {
    case 'usable':
      return search.usable ? 'Usable now' : null;
    case 'state':
      return state === undefined ? null : STATE_WORDS[state];
    case 'abrasive':
      return abrasive === undefined ? null : abrasive;
    case 'grain':
      return grain === undefined ? null : `grain ${grain}`;
    case 'diameter':
      if (diameterFromMm === undefined)
        return diameterToMm === undefined ? null : `up to ${size(diameterToMm)}`;
      return diameterToMm === undefined
        ? `from ${size(diameterFromMm)}`
        : `${size(diameterFromMm)} to ${size(diameterToMm)}`;
    case 'limit':
      return limitFromRpm === undefined
        ? null
        : `limit from ${formatQuantity({ value: limitFromRpm, unit: 'rpm' }, units)}`;
    case 'due':
      if (dueBy === undefined) return null;
      return dueBy === today ? 'due now' : `due by ${dayWords(dueBy)}`;
    case 'place':
      return search.place ?? null;
  }
}

/** The day so many days after an ISO date. */
export function daysAfter(isoDate: string, days: number): string {
  const day = new Date(`${isoDate}T00:00:00Z`);
  day.setUTCDate(day.getUTCDate() + days);
  return day.toISOString().slice(0, 10);
}
