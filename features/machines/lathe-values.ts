import * as yup from 'yup';

import {
  collectTexts,
  EMPTY_ENTRY,
  EMPTY_LIST,
  entryInUnits,
  entryRules,
  knownOrNull,
  listInUnits,
  listRule,
  mapEntries,
  recallTexts,
  storedEntry,
  storedList,
  UNKNOWN,
  type Entries,
  type EntryChange,
  type RecordValues,
  type TypedList,
} from '@/features/records';
import { newId } from '@/features/transport';
import type { CreateLatheRequest, Lathe } from '@/shared/contracts/machines';
import type { CompoundZero, DialReading, SpindleNose } from '@/shared/domain/machines';
import { UNIT_SYSTEMS, type UnitSystem } from '@/shared/domain/people';

import { LATHE_FIELDS, LATHE_LISTS, type LatheField, type LatheList } from './fields';
import { nameRule } from './name-rule';

export interface LatheValues
  extends RecordValues, Entries<LatheField>, Record<LatheList, TypedList> {
  name: string;
  crossSlideReads: DialReading;
  compoundZero: CompoundZero | typeof UNKNOWN;
  spindleNose: SpindleNose | typeof UNKNOWN;
}

export const newLathe = (units: UnitSystem): LatheValues => ({
  id: newId(),
  units,
  name: '',
  spindleSpeedsRpm: EMPTY_LIST,
  feedsMmPerRev: EMPTY_LIST,
  crossSlideDivisionMm: EMPTY_ENTRY,
  crossSlideReads: 'diameter',
  crossSlideDivisionsPerTurn: EMPTY_ENTRY,
  compoundZero: UNKNOWN,
  compoundDivisionMm: EMPTY_ENTRY,
  compoundTravelMm: EMPTY_ENTRY,
  compoundMmPerTurn: EMPTY_ENTRY,
  spindleNose: UNKNOWN,
});

export function latheValuesOf({ id, name, data, typed }: Lathe, units: UnitSystem): LatheValues {
  const stored = (field: LatheField) => storedEntry(data[field], LATHE_FIELDS[field], units);
  const list = (field: LatheList) => storedList(data[field], LATHE_LISTS[field], units);
  const values: LatheValues = {
    id,
    units,
    name,
    spindleSpeedsRpm: list('spindleSpeedsRpm'),
    feedsMmPerRev: list('feedsMmPerRev'),
    crossSlideDivisionMm: stored('crossSlideDivisionMm'),
    crossSlideReads: data.crossSlideReads,
    crossSlideDivisionsPerTurn: stored('crossSlideDivisionsPerTurn'),
    compoundZero: data.compoundZero ?? UNKNOWN,
    compoundDivisionMm: stored('compoundDivisionMm'),
    compoundTravelMm: stored('compoundTravelMm'),
    compoundMmPerTurn: stored('compoundMmPerTurn'),
    spindleNose: data.spindleNose ?? UNKNOWN,
  };
  return changed(values, recallTexts(typed, units));
}

const changed = (values: LatheValues, change: EntryChange): LatheValues =>
  mapEntries(values, LATHE_FIELDS, { change });

export function latheInUnits(values: LatheValues, units: UnitSystem): LatheValues {
  if (values.units === units) return values;
  return {
    ...changed(values, (entry, spec) => entryInUnits(entry, spec, units)),
    spindleSpeedsRpm: listInUnits(values.spindleSpeedsRpm, LATHE_LISTS.spindleSpeedsRpm, units),
    feedsMmPerRev: listInUnits(values.feedsMmPerRev, LATHE_LISTS.feedsMmPerRev, units),
    units,
  };
}

/**
 * @throws {RangeError} when the cross-slide's division is missing; the schema refuses that before.
 */
export function latheRequest(values: LatheValues): CreateLatheRequest {
  const division = values.crossSlideDivisionMm.si;
  if (division === null) throw new RangeError('A lathe without its dial cannot be sent.');
  return {
    id: values.id,
    name: values.name.trim(),
    data: {
      spindleSpeedsRpm: values.spindleSpeedsRpm.si ?? [],
      feedsMmPerRev: values.feedsMmPerRev.si ?? [],
      crossSlideDivisionMm: division,
      crossSlideReads: values.crossSlideReads,
      crossSlideDivisionsPerTurn: values.crossSlideDivisionsPerTurn.si,
      compoundZero: knownOrNull(values.compoundZero),
      compoundDivisionMm: values.compoundDivisionMm.si,
      compoundTravelMm: values.compoundTravelMm.si,
      compoundMmPerTurn: values.compoundMmPerTurn.si,
      spindleNose: knownOrNull(values.spindleNose),
    },
    typed: collectTexts(values.units, (change) => changed(values, change)),
  };
}

export const latheSchema = ({ units }: LatheValues) =>
  yup.object({
    name: nameRule('Enter the name by which the shop knows the lathe.'),
    spindleSpeedsRpm: listRule(LATHE_LISTS.spindleSpeedsRpm, units),
    feedsMmPerRev: listRule(LATHE_LISTS.feedsMmPerRev, units),
    ...entryRules(LATHE_FIELDS, units, ['crossSlideDivisionMm']),
  });

/** Guards what comes back from the device's storage. */
export function isLatheValues(value: unknown): value is LatheValues {
  const shape = value as Partial<LatheValues> | null;
  return (
    typeof shape === 'object' &&
    shape !== null &&
    typeof shape.id === 'string' &&
    UNIT_SYSTEMS.some((system) => system === shape.units) &&
    typeof shape.name === 'string' &&
    typeof shape.feedsMmPerRev?.text === 'string' &&
    typeof shape.crossSlideDivisionMm?.text === 'string'
  );
}
