import type { UnitSystem } from '../domain/people';
import {
  KILOGRAMS_PER_POUND,
  MM_PER_FOOT,
  MM_PER_INCH,
  MM_PER_M,
  NEWTONS_PER_POUND_FORCE,
  SECONDS_PER_MINUTE,
  WATTS_PER_HORSEPOWER,
} from './constants';
import type { UnitName } from './unit';

/** What a unit measures. Surface speeds and feed rates are kept apart: one typed for the other is a slip. */
type Measure =
  | 'length'
  | 'feed'
  | 'feed rate'
  | 'area'
  | 'specific removal'
  | 'volume'
  | 'removal rate'
  | 'surface speed'
  | 'rotation'
  | 'frequency'
  | 'angle'
  | 'force'
  | 'stiffness'
  | 'stress'
  | 'power'
  | 'specific energy'
  | 'mass'
  | 'density'
  | 'time'
  | 'temperature change'
  | 'taper'
  | 'share'
  | 'carats'
  | 'divisions'
  | 'passes'
  | 'softness'
  | 'plain';

interface EntryUnitRecord {
  measure: Measure;
  /** How many of the measure's own unit (the first in its rows) make one of this. */
  factor: number;
  /** As it stands behind a number. */
  label: string;
  /** Decimal places worth showing. */
  digits: number;
  /** Spellings read besides the key and the label, in lower case and without full stops. */
  spellings: readonly string[];
}

/** Builds one row of the table: label, decimal places and further spellings stand in one list. */
function unit(
  measure: Measure,
  factor: number,
  [label, digits, ...spellings]: [label: string, digits: number, ...spellings: string[]],
): EntryUnitRecord {
  return { measure, factor, label, digits, spellings };
}

const MM3_PER_IN3 = MM_PER_INCH ** 3;
const N_PER_MM_PER_LBF_PER_IN = NEWTONS_PER_POUND_FORCE / MM_PER_INCH;

/** Every unit that a person types or reads. */
export const ENTRY_UNITS = {
  mm: unit('length', 1, ['mm', 3, 'millimetre', 'millimetres', 'millimeter', 'millimeters']),
  cm: unit('length', 10, ['cm', 4]),
  m: unit('length', MM_PER_M, ['m', 6]),
  µm: unit('length', 1 / MM_PER_M, ['µm', 1, 'um', 'μm', 'micron', 'microns']),
  in: unit('length', MM_PER_INCH, ['in', 4, 'in.', 'inch', 'inches', '"', '″', '”', "''", '′′']),
  thou: unit('length', MM_PER_INCH / 1000, ['thou', 1]),
  ft: unit('length', MM_PER_FOOT, ['ft', 4, 'foot', 'feet', "'", '′']),
  'mm/rev': unit('feed', 1, ['mm/rev', 3, 'mm/r']),
  'in/rev': unit('feed', MM_PER_INCH, ['in/rev', 4, 'in/r', 'ipr']),
  'mm/min': unit('feed rate', 1, ['mm/min', 1]),
  'mm/s': unit('feed rate', SECONDS_PER_MINUTE, ['mm/s', 2]),
  'in/min': unit('feed rate', MM_PER_INCH, ['in/min', 2, 'ipm']),
  'in/s': unit('feed rate', MM_PER_INCH * SECONDS_PER_MINUTE, ['in/s', 3]),
  mm2: unit('area', 1, ['mm²', 2]),
  in2: unit('area', MM_PER_INCH ** 2, ['in²', 4]),
  'mm2/s': unit('specific removal', 1, ['mm³/(mm·s)', 2]),
  'in2/min': unit('specific removal', MM_PER_INCH ** 2 / SECONDS_PER_MINUTE, ['in³/(in·min)', 3]),
  mm3: unit('volume', 1, ['mm³', 1]),
  in3: unit('volume', MM3_PER_IN3, ['in³', 4]),
  'mm3/min': unit('removal rate', 1, ['mm³/min', 0]),
  'mm3/s': unit('removal rate', SECONDS_PER_MINUTE, ['mm³/s', 2]),
  'in3/min': unit('removal rate', MM3_PER_IN3, ['in³/min', 4]),
  'in3/s': unit('removal rate', MM3_PER_IN3 * SECONDS_PER_MINUTE, ['in³/s', 6]),
  'm/min': unit('surface speed', 1, ['m/min', 1]),
  'm/s': unit('surface speed', SECONDS_PER_MINUTE, ['m/s', 1, 'm/sec']),
  'ft/min': unit('surface speed', MM_PER_FOOT / MM_PER_M, ['ft/min', 0, 'sfpm', 'sfm', 'fpm']),
  rpm: unit('rotation', 1, ['rpm', 0, 'r/min', 'rev/min', '1/min']),
  Hz: unit('frequency', 1, ['Hz', 0]),
  deg: unit('angle', 1, ['°', 2, 'degree', 'degrees']),
  N: unit('force', 1, ['N', 1]),
  lbf: unit('force', NEWTONS_PER_POUND_FORCE, ['lbf', 2, 'lb', 'lbs']),
  'N/mm': unit('stiffness', 1, ['N/mm', 0]),
  'lbf/in': unit('stiffness', N_PER_MM_PER_LBF_PER_IN, ['lbf/in', 0, 'lb/in']),
  'N/mm2': unit('stress', 1, ['N/mm²', 0, 'mpa']),
  psi: unit('stress', N_PER_MM_PER_LBF_PER_IN / MM_PER_INCH, ['psi', 0]),
  W: unit('power', 1, ['W', 0, 'watt', 'watts']),
  kW: unit('power', 1000, ['kW', 3]),
  hp: unit('power', WATTS_PER_HORSEPOWER, ['hp', 3]),
  'J/mm3': unit('specific energy', 1, ['J/mm³', 1]),
  'hp·min/in3': unit('specific energy', (WATTS_PER_HORSEPOWER * SECONDS_PER_MINUTE) / MM3_PER_IN3, [
    'hp·min/in³',
    1,
    'hp.min/in3',
  ]),
  kg: unit('mass', 1, ['kg', 3]),
  lb: unit('mass', KILOGRAMS_PER_POUND, ['lb', 3, 'lbs']),
  'kg/m3': unit('density', 1, ['kg/m³', 0]),
  s: unit('time', 1, ['s', 1, 'sec', 'second', 'seconds']),
  min: unit('time', SECONDS_PER_MINUTE, ['min', 1, 'minute', 'minutes']),
  K: unit('temperature change', 1, ['°C', 1, 'c']),
  '°F': unit('temperature change', 5 / 9, ['°F', 1, 'f']),
  taper: unit('taper', 1, ['mm/mm', 5]),
  'in/ft': unit('taper', MM_PER_INCH / MM_PER_FOOT, ['in/ft', 4]),
  '%': unit('share', 1, ['%', 1, 'percent']),
  ct: unit('carats', 1, ['ct', 2, 'carat', 'carats']),
  div: unit('divisions', 1, ['div', 1, 'divs', 'divisions']),
  passes: unit('passes', 1, ['passes', 0, 'pass']),
  '1/mm': unit('softness', 1, ['1/mm', 2]),
  '1/in': unit('softness', 1 / MM_PER_INCH, ['1/in', 0]),
  '1': unit('plain', 1, ['', 3]),
} satisfies Record<UnitName, EntryUnitRecord> & Record<string, EntryUnitRecord>;

export type EntryUnit = keyof typeof ENTRY_UNITS;

/** What the inch system shows in place of a metric unit; the rest are common to both. */
const INCH_UNITS: Partial<Record<UnitName, EntryUnit>> = {
  mm: 'in',
  'mm/rev': 'in/rev',
  'mm/min': 'in/min',
  'mm/s': 'in/s',
  mm2: 'in2',
  'mm2/s': 'in2/min',
  mm3: 'in3',
  'mm3/min': 'in3/min',
  'mm3/s': 'in3/s',
  'm/s': 'ft/min',
  'm/min': 'ft/min',
  N: 'lbf',
  'N/mm': 'lbf/in',
  'N/mm2': 'psi',
  W: 'hp',
  'J/mm3': 'hp·min/in3',
  kg: 'lb',
  K: '°F',
  taper: 'in/ft',
  '1/mm': '1/in',
};

/**
 * The unit in which a person reads and types a value.
 *
 * @param unit - the unit the value is computed in.
 * @param system - the person's unit system.
 * @returns the unit to show; millimetre units stay as they are.
 * @source nist-sp-811
 * @example displayUnit('m/s', 'inch') // 'ft/min'
 */
export function displayUnit(unit: UnitName, system: UnitSystem): EntryUnit {
  return (system === 'inch' && INCH_UNITS[unit]) || unit;
}

/**
 * The unit's name as it stands behind a number or in a field's label.
 *
 * @param unit - the unit the value is computed in.
 * @param system - the person's unit system.
 * @returns the label, empty for a plain number.
 * @source nist-sp-811
 * @example unitLabel('mm3/min', 'mm') // 'mm³/min'
 */
export function unitLabel(unit: UnitName, system: UnitSystem): string {
  return ENTRY_UNITS[displayUnit(unit, system)].label;
}

/**
 * One unit's value in another unit of the same measure. Inches and feet are exact.
 *
 * @param value - any finite number, in `from`.
 * @param from - the unit it is in.
 * @param to - the unit wanted; it must measure the same thing.
 * @returns the value in `to`, unrounded.
 * @throws {RangeError} when the two units measure different things.
 * @source nist-sp-811
 * @example convertUnit(1.25, 'in', 'mm') // 31.75
 */
export function convertUnit(value: number, from: EntryUnit, to: EntryUnit): number {
  if (from === to) return value;
  if (!sameMeasure(from, to)) throw new RangeError(`${from} and ${to} measure different things`);
  return (value * ENTRY_UNITS[from].factor) / ENTRY_UNITS[to].factor;
}

/**
 * Whether two units measure the same thing, so that one can be read as the other.
 *
 * @param a - a unit.
 * @param b - another.
 * @returns true when a value can be carried from one to the other.
 * @source nist-sp-811
 * @example sameMeasure('ft/min', 'm/s') // true
 */
export function sameMeasure(a: EntryUnit, b: EntryUnit): boolean {
  return ENTRY_UNITS[a].measure === ENTRY_UNITS[b].measure;
}
