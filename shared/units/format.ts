import type { UnitSystem } from '../domain/people';
import { convertUnit, displayUnit, ENTRY_UNITS } from './entry-units';
import { parseQuantity } from './parse';
import type { UnitName } from './unit';

export type Rounding = 'nearest' | 'down' | 'up';

export interface FormatOptions {
  /** Limits are rounded down, needs up; everything else to the nearest. */
  rounding?: Rounding;
  /** Decimal places; the unit's own when left out. */
  digits?: number;
  /** Keeps trailing zeros, where numbers stand in a column to be compared. */
  fixed?: boolean;
  /** False leaves the unit to the label beside it. */
  withUnit?: boolean;
}

const NO_BREAK_SPACE = '\u00a0';
const MINUS = '\u2212';
const MISSING = '\u2013';
/** Doubles put 0.3/0.1 just under 3: rounding down must not lose a step to that. */
const SLACK = 1e-9;
const SLACK_OF_LARGE_VALUES = 1e-12;
/** An entry reads back as its value within this share of it. */
const READS_BACK_WITHIN = 1e-9;
const MOST_DECIMALS = 20;

/**
 * A value as a person reads it, in their unit, with no more places than it deserves: inches to 0.0001,
 * millimetres to 0.001, rpm and ft/min whole, m/s to one place. Thousands stand apart by a no-break space.
 *
 * @param quantity - the value and the unit it is computed in.
 * @param quantity.value - any number; one that is not finite reads as a dash.
 * @param quantity.unit - the unit it is computed in.
 * @param system - the person's unit system.
 * @param options - rounding, places, fixed places, and whether the unit is written.
 * @returns the text, with a true minus sign.
 * @source nist-sp-811
 * @example formatQuantity({ value: 31.75, unit: 'mm' }, 'inch') // '1.25\u00a0in'
 * @example formatQuantity({ value: 15438.9, unit: 'rpm' }, 'mm', { rounding: 'down' }) // '15\u00a0438\u00a0rpm'
 */
export function formatQuantity(
  quantity: { value: number; unit: UnitName },
  system: UnitSystem,
  options: FormatOptions = {},
): string {
  if (!Number.isFinite(quantity.value)) return MISSING;
  const unit = displayUnit(quantity.unit, system);
  const { label, digits: usual } = ENTRY_UNITS[unit];
  const digits = options.digits ?? usual;
  const shown = convertUnit(quantity.value, quantity.unit, unit);
  const plain = rounded(shown, digits, options.rounding ?? 'nearest').toFixed(digits);
  const text = signed(grouped(options.fixed ? plain : withoutTrailingZeros(plain)));
  if (options.withUnit === false || label === '') return text;
  return text + (label === '°' ? '' : NO_BREAK_SPACE) + (text === '1' ? singular(label) : label);
}

/**
 * The text that puts a stored value into a field in the person's unit, with as few places as read back to
 * it within a billionth.
 *
 * @param value - the stored value, in `unit`; one that is not finite gives an empty field.
 * @param unit - the unit it is stored in.
 * @param system - the person's unit system.
 * @returns a bare number that parseQuantity reads, without its unit.
 * @source nist-sp-811
 * @example entryText(31.75, 'mm', 'inch') // '1.25'
 */
export function entryText(value: number, unit: UnitName, system: UnitSystem): string {
  if (!Number.isFinite(value)) return '';
  const shownUnit = displayUnit(unit, system);
  const shown = convertUnit(value, unit, shownUnit);
  for (let digits = 0; digits < MOST_DECIMALS; digits += 1) {
    const text = shown.toFixed(digits);
    const read = parseQuantity(text, unit, shownUnit);
    if (read.ok && Math.abs(read.value - value) <= READS_BACK_WITHIN * Math.abs(value)) return text;
  }
  return shown.toFixed(MOST_DECIMALS);
}

/** The one unit whose name counts: "1 pass", "2 passes". */
const singular = (label: string) => (label === 'passes' ? 'pass' : label);

function rounded(value: number, digits: number, rounding: Rounding): number {
  const scale = 10 ** digits;
  const steps = value * scale;
  const slack = SLACK + SLACK_OF_LARGE_VALUES * Math.abs(steps);
  if (rounding === 'down') return Math.floor(steps + slack) / scale;
  if (rounding === 'up') return Math.ceil(steps - slack) / scale;
  return Math.round(steps + slack) / scale;
}

function withoutTrailingZeros(plain: string): string {
  return plain.includes('.') ? plain.replace(/\.?0+$/, '') : plain;
}

function grouped(plain: string): string {
  const [whole = '', decimals] = plain.split('.');
  const spaced = whole.replace(/\B(?=(\d{3})+$)/g, NO_BREAK_SPACE);
  return decimals === undefined ? spaced : `${spaced}.${decimals}`;
}

function signed(plain: string): string {
  const magnitude = plain.replace('-', '');
  return plain.startsWith('-') && /[1-9]/.test(plain) ? MINUS + magnitude : magnitude;
}
