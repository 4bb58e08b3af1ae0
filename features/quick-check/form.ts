import * as yup from 'yup';

import { quantityText, readEntry, type QuantitySpec } from '@/features/forms';
import { UNIT_SYSTEMS, type UnitSystem } from '@/shared/domain/people';
import type { QuickCheckInput } from '@/shared/rules';
import { entryText } from '@/shared/units/format';

export const MARKING_UNITS = ['m/s', 'ft/min', 'rpm'] as const;
export type MarkingUnit = (typeof MARKING_UNITS)[number];

export const SPINDLE_WAYS = ['rpm', 'pulleys'] as const;
export type SpindleWay = (typeof SPINDLE_WAYS)[number];

export interface QuickCheckValues {
  units: UnitSystem;
  diameter: string;
  marking: string;
  markingUnit: MarkingUnit;
  spindleWay: SpindleWay;
  rpm: string;
  motorRpm: string;
  drivingPulley: string;
  drivenPulley: string;
}

type QuantityName = Exclude<keyof QuickCheckValues, 'units' | 'markingUnit' | 'spindleWay'>;

export const initialValues: QuickCheckValues = {
  units: 'mm',
  diameter: '',
  marking: '',
  markingUnit: 'm/s',
  spindleWay: 'rpm',
  rpm: '',
  motorRpm: '',
  drivingPulley: '',
  drivenPulley: '',
};

const SPECS: Record<Exclude<QuantityName, 'marking'>, QuantitySpec> = {
  diameter: { label: 'Wheel diameter, new', unit: 'mm', limit: 'wheelDiameterMm' },
  rpm: { label: 'Spindle speed', unit: 'rpm', limit: 'spindleRpm' },
  motorRpm: {
    label: 'Motor, no load',
    unit: 'rpm',
    limit: 'motorRpm',
  },
  drivingPulley: { label: 'Pulley on the motor', unit: 'mm', limit: 'pulleyMm' },
  drivenPulley: { label: 'Pulley on the spindle', unit: 'mm', limit: 'pulleyMm' },
};

export function specOf(name: QuantityName, markingUnit: MarkingUnit): QuantitySpec {
  if (name !== 'marking') return SPECS[name];
  return markingUnit === 'rpm'
    ? { label: 'Marked limit', unit: 'rpm', limit: 'wheelRpm' }
    : // A bare number is in the marking's own unit, whatever units the person works in.
      { label: 'Marked limit', unit: 'm/s', limit: 'wheelSpeedMPerS', bare: markingUnit };
}

/** The unit system that shows the marking's own unit at the field's edge. */
export const systemOf = (name: QuantityName, values: QuickCheckValues): UnitSystem =>
  name === 'marking' ? (values.markingUnit === 'ft/min' ? 'inch' : 'mm') : values.units;

const QUANTITIES: QuantityName[] = [
  'diameter',
  'marking',
  'rpm',
  'motorRpm',
  'drivingPulley',
  'drivenPulley',
];

export const schema = yup.lazy((values: QuickCheckValues) =>
  yup.object(
    Object.fromEntries(
      QUANTITIES.map((name) => [
        name,
        quantityText({
          spec: specOf(name, values.markingUnit),
          system: systemOf(name, values),
        }),
      ]),
    ),
  ),
);

export function toQuickCheck(values: QuickCheckValues): QuickCheckInput {
  const read = (name: QuantityName) =>
    readEntry(values[name], specOf(name, values.markingUnit), systemOf(name, values)).si;
  const marking = read('marking');
  return {
    wheelDiameterMm: read('diameter'),
    marking: values.markingUnit === 'rpm' ? { rpm: marking } : { speedMPerS: marking },
    spindle:
      values.spindleWay === 'rpm'
        ? { rpm: read('rpm') }
        : {
            motorRpm: read('motorRpm'),
            drivingPulleyMm: read('drivingPulley'),
            drivenPulleyMm: read('drivenPulley'),
          },
  };
}

/** The same wheel and pulleys in other units; what cannot be read stays as typed. */
export function inUnits(values: QuickCheckValues, units: UnitSystem): QuickCheckValues {
  const shown = (name: 'diameter' | 'drivingPulley' | 'drivenPulley') => {
    const { si } = readEntry(values[name], SPECS[name], values.units);
    return si === null ? values[name] : entryText(si, 'mm', units);
  };
  return {
    ...values,
    units,
    diameter: shown('diameter'),
    drivingPulley: shown('drivingPulley'),
    drivenPulley: shown('drivenPulley'),
  };
}

/** Guards what comes back from the device's storage. */
export function isQuickCheckValues(value: unknown): value is QuickCheckValues {
  if (typeof value !== 'object' || value === null) return false;
  const entries = new Map(Object.entries(value));
  return (
    QUANTITIES.every((name) => typeof entries.get(name) === 'string') &&
    UNIT_SYSTEMS.some((system) => system === entries.get('units')) &&
    MARKING_UNITS.some((unit) => unit === entries.get('markingUnit')) &&
    SPINDLE_WAYS.some((way) => way === entries.get('spindleWay'))
  );
}
