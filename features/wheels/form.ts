import * as yup from 'yup';

import {
  collectTexts,
  dateText,
  EMPTY_ENTRY,
  entryInUnits,
  entryRules,
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
import { TEXT_LIMITS } from '@/shared/domain/limits';
import { UNIT_SYSTEMS, type UnitSystem } from '@/shared/domain/people';
import type {
  LookResult,
  MarkingPlace,
  RingResult,
  WheelData,
  WheelState,
} from '@/shared/domain/wheels';
import { formatQuantity } from '@/shared/units/format';

import { MANDREL_FIELDS, WHEEL_FIELDS, type MandrelField, type WheelField } from './fields';
import { SPEED_UNITS, speedRule, storedSpeed, typedSpeed, type SpeedUnit } from './marked-speed';

interface MandrelValues extends Entries<MandrelField> {
  threaded: boolean;
}

export interface WheelValues extends RecordValues, Entries<WheelField> {
  tag: string;
  marking: string;
  markedSpeedMPerS: TypedEntry;
  speedUnit: SpeedUnit;
  markingReadOn: MarkingPlace | typeof UNKNOWN;
  isMounted: boolean;
  mounted: MandrelValues;
  looked: LookResult | typeof UNKNOWN;
  rung: RingResult | typeof UNKNOWN;
  expiresOn: string;
  state: WheelState;
  setAsideReason: string;
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
    markedRpm: EMPTY_ENTRY,
    markedSpeedMPerS: EMPTY_ENTRY,
    speedUnit: units === 'inch' ? 'ft/min' : 'm/s',
    markingReadOn: UNKNOWN,
    isMounted: false,
    mounted: {
      mandrelDiameterMm: EMPTY_ENTRY,
      overhangMm: EMPTY_ENTRY,
      makerMaximumRpm: EMPTY_ENTRY,
      threaded: false,
    },
    looked: UNKNOWN,
    rung: UNKNOWN,
    expiresOn: '',
    state: 'on the rack',
    setAsideReason: '',
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
    markedRpm: stored(data.markedRpm, 'markedRpm'),
    markedSpeedMPerS: storedSpeed(data.markedSpeedMPerS, speedUnit),
    speedUnit,
    markingReadOn: data.markingReadOn ?? UNKNOWN,
    isMounted: data.mounted !== null,
    mounted: {
      mandrelDiameterMm: mandrel(data.mounted?.mandrelDiameterMm, 'mandrelDiameterMm'),
      overhangMm: mandrel(data.mounted?.overhangMm, 'overhangMm'),
      makerMaximumRpm: mandrel(data.mounted?.makerMaximumRpm, 'makerMaximumRpm'),
      threaded: data.mounted?.threaded ?? false,
    },
    looked: data.looked ?? UNKNOWN,
    rung: data.rung ?? UNKNOWN,
    expiresOn: data.expiresOn ?? '',
    state: data.state,
    setAsideReason: data.setAsideReason ?? '',
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

/** The wheel as far as it is typed; null while a size is missing or cannot be read. */
export function wheelDataOf(values: WheelValues): WheelData | null {
  const { diameterNewMm, diameterNowMm, widthMm, holeMm, mounted, isMounted } = values;
  const hole = holeMm.si ?? (isMounted ? 0 : null);
  if (diameterNewMm.si === null || widthMm.si === null || hole === null) return null;
  if (isMounted && (mounted.mandrelDiameterMm.si === null || mounted.overhangMm.si === null))
    return null;
  return {
    marking: values.marking.trim() || null,
    diameterNewMm: diameterNewMm.si,
    diameterNowMm: diameterNowMm.si ?? diameterNewMm.si,
    widthMm: widthMm.si,
    holeMm: hole,
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
    looked: knownOrNull(values.looked),
    rung: knownOrNull(values.rung),
    expiresOn: readDate(values.expiresOn),
    state: values.state,
    setAsideReason: values.state === 'set aside' ? values.setAsideReason.trim() : null,
  };
}

/**
 * @throws {RangeError} when a size is missing; the schema refuses that before.
 */
export function toRequest(values: WheelValues): CreateWheelRequest {
  const data = wheelDataOf(values);
  if (!data) throw new RangeError('A wheel without its sizes cannot be sent.');
  const typed = collectTexts(values.units, (change) => changed(values, change));
  typed[SPEED_UNIT_KEY] = values.speedUnit;
  return { id: values.id, tag: values.tag.trim(), data, typed };
}

const notLarger = (units: UnitSystem) =>
  yup.mixed<TypedEntry>().test('not larger', (now, { parent, createError }) => {
    const fresh = (parent as WheelValues).diameterNewMm.si;
    if (!now || now.si === null || fresh === null || now.si <= fresh) return true;
    const limit = formatQuantity({ value: fresh, unit: 'mm' }, units, { rounding: 'down' });
    return createError({ message: `Diameter now is at most ${limit}, the diameter when new.` });
  });

const holeFits = (units: UnitSystem) =>
  yup.mixed<TypedEntry>().test('hole fits', (hole, { parent, createError }) => {
    const { diameterNewMm, diameterNowMm, isMounted } = parent as WheelValues;
    const outer = diameterNowMm.si ?? diameterNewMm.si;
    if (!hole) return true;
    if (hole.text.trim() === '' && !isMounted)
      return createError({ message: 'Enter the hole; 0 where there is none.' });
    if (hole.si === null || outer === null || hole.si < outer) return true;
    const limit = formatQuantity({ value: outer, unit: 'mm' }, units, { rounding: 'down' });
    return createError({ message: `Hole is smaller than the wheel, ${limit}.` });
  });

export function wheelSchema({ units, speedUnit, isMounted, state }: WheelValues) {
  const rules = entryRules(WHEEL_FIELDS, units, ['diameterNewMm', 'widthMm']);
  return yup.object({
    tag: yup
      .string()
      .trim()
      .required('Enter the tag: the name under which the wheel hangs on the rack.')
      .max(TEXT_LIMITS.tag, `The tag has at most ${TEXT_LIMITS.tag} characters.`),
    marking: yup
      .string()
      .trim()
      .max(TEXT_LIMITS.marking, `The marking has at most ${TEXT_LIMITS.marking} characters.`),
    ...rules,
    diameterNowMm: rules.diameterNowMm.concat(notLarger(units)),
    holeMm: rules.holeMm.concat(holeFits(units)),
    markedSpeedMPerS: speedRule(speedUnit),
    ...(isMounted
      ? {
          mounted: yup.object(
            entryRules(MANDREL_FIELDS, units, ['mandrelDiameterMm', 'overhangMm']),
          ),
        }
      : {}),
    expiresOn: dateText('Expires on'),
    ...(state === 'set aside'
      ? {
          setAsideReason: yup
            .string()
            .trim()
            .required('Enter why the wheel is set aside.')
            .max(TEXT_LIMITS.note, `The reason has at most ${TEXT_LIMITS.note} characters.`),
        }
      : {}),
  });
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
    typeof shape.mounted?.overhangMm?.text === 'string'
  );
}
