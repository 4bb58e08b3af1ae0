import * as yup from 'yup';

import { readEntry, type QuantitySpec } from '@/features/forms';
import type { TypedEntry } from '@/features/records';
import { LIMITS } from '@/shared/domain/limits';
import { convertUnit, ENTRY_UNITS } from '@/shared/units/entry-units';
import { entryText, formatQuantity } from '@/shared/units/format';

/** What stands on wheels; the reader's own units do not change it. */
export const SPEED_UNITS = ['m/s', 'm/min', 'ft/min'] as const;
export type SpeedUnit = (typeof SPEED_UNITS)[number];

const SPEED: QuantitySpec = { label: 'Marked speed', unit: 'm/s', limit: 'wheelSpeedMPerS' };

/** The range in the marking's unit, rounded inwards so that both ends are accepted. */
function rangeWords(unit: SpeedUnit): string {
  const { min, max } = LIMITS.wheelSpeedMPerS;
  const low = Math.ceil(convertUnit(min, 'm/s', unit));
  const high = Math.floor(convertUnit(max, 'm/s', unit));
  return `${low} to ${high} ${ENTRY_UNITS[unit].label}`;
}

export const speedHint = (unit: SpeedUnit) =>
  `Leave empty where no speed is marked. ${rangeWords(unit)}.`;

export const typedSpeed = (text: string, unit: SpeedUnit): TypedEntry => ({
  text,
  si: readEntry(text, { ...SPEED, bare: unit }, 'mm').si,
});

/** The number in the unit it is marked in. */
function speedText(mPerS: number, unit: SpeedUnit): string {
  switch (unit) {
    case 'm/s':
      return entryText(mPerS, 'm/s', 'mm');
    case 'ft/min':
      return entryText(mPerS, 'm/s', 'inch');
    case 'm/min':
      return entryText(convertUnit(mPerS, 'm/s', 'm/min'), 'm/min', 'mm');
  }
}

export const storedSpeed = (mPerS: number | null, unit: SpeedUnit): TypedEntry =>
  mPerS === null ? { text: '', si: null } : { text: speedText(mPerS, unit), si: mPerS };

/** "25 m/s", in the unit of the marking. */
export function speedWords(mPerS: number, unit: SpeedUnit): string {
  if (unit === 'ft/min') return formatQuantity({ value: mPerS, unit: 'm/s' }, 'inch');
  const value = convertUnit(mPerS, 'm/s', unit);
  return formatQuantity({ value, unit }, 'mm');
}

export const speedRule = (unit: SpeedUnit) =>
  yup.mixed<TypedEntry>().test('speed', (entry, context) => {
    if (!entry || entry.si !== null || entry.text.trim() === '') return true;
    return context.createError({ message: `Marked speed is from ${rangeWords(unit)}.` });
  });
