import {
  collectTexts,
  EMPTY_ENTRY,
  entryInUnits,
  knownOrNull,
  mapEntries,
  readDate,
  recallTexts,
  storedEntry,
  UNKNOWN,
  type Entries,
  type EntryChange,
  type RecordValues,
  type TypedEntry,
} from '@/features/records';
import { newId } from '@/features/transport';
import type { CreateWheelRequest, Wheel } from '@/shared/contracts/wheels';
import { UNIT_SYSTEMS, type UnitSystem } from '@/shared/domain/people';
import {
  MOUNTED_SHAPE,
  type LookResult,
  type MarkingPlace,
  type RackWheel,
  type RingResult,
  type WheelRecord,
  type WheelShape,
  type WheelState,
} from '@/shared/domain/wheels';

import { MANDREL_FIELDS, WHEEL_FIELDS, type MandrelField, type WheelField } from './fields';
import { SPEED_UNITS, storedSpeed, typedSpeed, type SpeedUnit } from './marked-speed';

interface MandrelValues extends Entries<MandrelField> {
  threaded: boolean;
}

export interface WheelValues extends RecordValues, Entries<WheelField> {
  tag: string;
  marking: string;
  markedSpeedMPerS: TypedEntry;
  speedUnit: SpeedUnit;
  markingReadOn: MarkingPlace | typeof UNKNOWN;
  shape: WheelShape | typeof UNKNOWN;
  /** The shape says it, and the fields of the mandrel hang on it. */
  isMounted: boolean;
  mounted: MandrelValues;
  looked: LookResult | typeof UNKNOWN;
  rung: RingResult | typeof UNKNOWN;
  /** When a new wheel came; empty is today. */
  receivedOn: string;
  madeOn: string;
  expiresOn: string;
  place: string;
  notes: string;
  /** As the wheel's entries have it: shown, and not edited here. */
  state: WheelState;
  setAsideReason: string;
  unsigned: boolean;
}

const SPEED_UNIT_KEY = '@speedUnit';

export function newWheel(units: UnitSystem): WheelValues {
  return {
    id: newId(),
    units,
    tag: '',
    marking: '',
    diameterNewMm: EMPTY_ENTRY,
    diameterNowMm: EMPTY_ENTRY,
    widthMm: EMPTY_ENTRY,
    holeMm: EMPTY_ENTRY,
    smallestUsableMm: EMPTY_ENTRY,
    markedRpm: EMPTY_ENTRY,
    markedSpeedMPerS: EMPTY_ENTRY,
    speedUnit: units === 'inch' ? 'ft/min' : 'm/s',
    markingReadOn: UNKNOWN,
    shape: UNKNOWN,
    isMounted: false,
    mounted: {
      mandrelDiameterMm: EMPTY_ENTRY,
      overhangMm: EMPTY_ENTRY,
      makerMaximumRpm: EMPTY_ENTRY,
      threaded: false,
    },
    looked: UNKNOWN,
    rung: UNKNOWN,
    receivedOn: '',
    madeOn: '',
    expiresOn: '',
    place: '',
    notes: '',
    state: 'on the rack',
    setAsideReason: '',
    unsigned: false,
  };
}

export const speedUnitOf = (typed: Wheel['typed'], units: UnitSystem): SpeedUnit =>
  SPEED_UNITS.find((unit) => unit === typed[SPEED_UNIT_KEY]) ??
  (units === 'inch' ? 'ft/min' : 'm/s');

export function valuesOf({ id, tag, data, typed }: Wheel, units: UnitSystem): WheelValues {
  const speedUnit = speedUnitOf(typed, units);
  const stored = (value: number | null, field: WheelField) =>
    storedEntry(value, WHEEL_FIELDS[field], units);
  const mandrel = (value: number | null | undefined, field: MandrelField) =>
    storedEntry(value ?? null, MANDREL_FIELDS[field], units);
  const values: WheelValues = {
    id,
    units,
    tag,
    marking: data.marking ?? '',
    diameterNewMm: stored(data.diameterNewMm, 'diameterNewMm'),
    diameterNowMm: stored(data.diameterNowMm, 'diameterNowMm'),
    widthMm: stored(data.widthMm, 'widthMm'),
    holeMm: stored(data.holeMm, 'holeMm'),
    smallestUsableMm: stored(data.smallestUsableMm, 'smallestUsableMm'),
    markedRpm: stored(data.markedRpm, 'markedRpm'),
    markedSpeedMPerS: storedSpeed(data.markedSpeedMPerS, speedUnit),
    speedUnit,
    markingReadOn: data.markingReadOn ?? UNKNOWN,
    shape: data.shape ?? (data.mounted === null ? UNKNOWN : MOUNTED_SHAPE),
    isMounted: data.mounted !== null,
    mounted: {
      mandrelDiameterMm: mandrel(data.mounted?.mandrelDiameterMm, 'mandrelDiameterMm'),
      overhangMm: mandrel(data.mounted?.overhangMm, 'overhangMm'),
      makerMaximumRpm: mandrel(data.mounted?.makerMaximumRpm, 'makerMaximumRpm'),
      threaded: data.mounted?.threaded ?? false,
    },
    looked: data.looked ?? UNKNOWN,
    rung: data.rung ?? UNKNOWN,
    receivedOn: '',
    madeOn: data.madeOn ?? '',
    expiresOn: data.expiresOn ?? '',
    place: data.place ?? '',
    notes: data.notes ?? '',
    state: data.state,
    setAsideReason: data.setAsideReason ?? '',
    unsigned: data.unsigned,
  };
  return changed(values, recallTexts(typed, units));
}

const changed = (values: WheelValues, change: EntryChange): WheelValues => ({
  ...mapEntries(values, WHEEL_FIELDS, { change }),
  mounted: mapEntries(values.mounted, MANDREL_FIELDS, { change, prefix: 'mounted.' }),
});

export const inUnits = (values: WheelValues, units: UnitSystem): WheelValues =>
  values.units === units
    ? values
    : { ...changed(values, (entry, spec) => entryInUnits(entry, spec, units)), units };

/** The marked number stays as it is typed; another unit makes it another speed. */
export const withSpeedUnit = (values: WheelValues, speedUnit: SpeedUnit): WheelValues => ({
  ...values,
  speedUnit,
  markedSpeedMPerS: typedSpeed(values.markedSpeedMPerS.text, speedUnit),
});

export const withShape = (values: WheelValues, shape: WheelValues['shape']): WheelValues => ({
  ...values,
  shape,
  isMounted: shape === MOUNTED_SHAPE,
});

/** The wheel as far as it is typed; null while a size is missing or cannot be read. */
export function wheelDataOf(values: WheelValues): RackWheel | null {
  const record = recordOf(values);
  if (!record) return null;
  return {
    ...record,
    diameterNowMm: values.diameterNowMm.si ?? record.diameterNewMm,
    looked: knownOrNull(values.looked),
    rung: knownOrNull(values.rung),
    state: values.state,
    setAsideReason: values.setAsideReason || null,
    unsigned: values.unsigned,
  };
}

function recordOf(values: WheelValues): WheelRecord | null {
  const { mounted, isMounted } = values;
  const { diameterNewMm, widthMm, holeMm, ...plate } = plateOf(values);
  if (diameterNewMm === null || widthMm === null || holeMm === null) return null;
  if (isMounted && (mounted.mandrelDiameterMm.si === null || mounted.overhangMm.si === null))
    return null;
  return {
    ...plate,
    diameterNewMm,
    widthMm,
    holeMm,
    smallestUsableMm: values.smallestUsableMm.si,
    madeOn: readDate(values.madeOn),
    expiresOn: readDate(values.expiresOn),
    place: values.place.trim() || null,
    notes: values.notes.trim() || null,
  };
}

/** What stands on the wheel's plate while it is typed; null where a size is missing. */
export function plateOf(values: WheelValues) {
  const { mounted, isMounted } = values;
  const shape = knownOrNull(values.shape);
  return {
    marking: values.marking.trim() || null,
    shape: isMounted ? MOUNTED_SHAPE : shape === MOUNTED_SHAPE ? null : shape,
    diameterNewMm: values.diameterNewMm.si,
    widthMm: values.widthMm.si,
    holeMm: values.holeMm.si ?? (isMounted ? 0 : null),
    markedRpm: values.markedRpm.si,
    markedSpeedMPerS: values.markedSpeedMPerS.si,
    markingReadOn: knownOrNull(values.markingReadOn),
    mounted: isMounted
      ? {
          mandrelDiameterMm: mounted.mandrelDiameterMm.si ?? 0,
          overhangMm: mounted.overhangMm.si ?? 0,
          threaded: mounted.threaded,
          makerMaximumRpm: mounted.makerMaximumRpm.si,
        }
      : null,
  };
}

/**
 * @throws {RangeError} when a size is missing; the schema refuses that before.
 */
export function toRequest(values: WheelValues): CreateWheelRequest {
  const data = recordOf(values);
  if (!data) throw new RangeError('A wheel without its sizes cannot be sent.');
  const typed = collectTexts(values.units, (change) => changed(values, change));
  typed[SPEED_UNIT_KEY] = values.speedUnit;
  const received = {
    on: readDate(values.receivedOn),
    diameterMm: values.diameterNowMm.si,
    looked: knownOrNull(values.looked),
    rung: knownOrNull(values.rung),
  };
  return { id: values.id, tag: values.tag.trim(), data, received, typed };
}

/** Guards what comes back from the device's storage. */
export function isWheelValues(value: unknown): value is WheelValues {
  const shape = value as Partial<WheelValues> | null;
  return (
    typeof shape === 'object' &&
    shape !== null &&
    typeof shape.id === 'string' &&
    UNIT_SYSTEMS.some((system) => system === shape.units) &&
    typeof shape.tag === 'string' &&
    typeof shape.diameterNewMm?.text === 'string' &&
    typeof shape.mounted?.overhangMm?.text === 'string' &&
    typeof shape.smallestUsableMm?.text === 'string' &&
    typeof shape.receivedOn === 'string' &&
    typeof shape.place === 'string'
  );
}
