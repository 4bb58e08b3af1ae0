import { convertUnit, ENTRY_UNITS, sameMeasure, type EntryUnit } from './entry-units';
import type { UnitName } from './unit';

export type ParseFailure = 'empty' | 'unreadable' | 'wrong unit' | 'ambiguous';

export type ParsedQuantity =
  /** The value in the unit asked for, and the unit it was typed in. */
  { ok: true; value: number; unit: EntryUnit } | { ok: false; reason: ParseFailure };

type Reading = { ok: true; value: number } | { ok: false; reason: 'unreadable' | 'ambiguous' };

const SPACES = /[\s\u00a0\u2007\u2009\u202f]+/g;
const VULGAR_FRACTION = /[¼-¾⅐-⅞]/g;
const MINUS_SIGNS = /[−–‒]/g;

const FRACTION = /^(?:(\d+)[ -])?(\d+)\/(\d+)(?![\d.,/])/;
const GROUPED = /^[1-9]\d{0,2}(?: \d{3})+(?:[.,]\d*)?(?![\d.,/])/;
const DIGITS_AND_MARKS = /^[\d.,]+/;
const DECIMAL = /^(?:\d+[.,]?\d*|[.,]\d+)$/;
const MIXED_MARKS = /^\d{1,3}(?:[.,]\d{3})+(?:[.,]\d*)?$/;
const THREE_AFTER_MARK = /^[1-9]\d{0,2}[.,]\d{3}$/;
const DEGREES_AND_MINUTES = /^(\d+) ?(?:°|deg) ?(\d+(?:[.,]\d+)?) ?(?:'|′|min)$/;

/** Where values run to thousands, "23,000" is twenty-three thousand to some and twenty-three to others. */
const RUNS_TO_THOUSANDS: readonly EntryUnit[] = ['rpm', 'ft/min', 'm/min'];

/**
 * Reads what a person typed into a field. Takes comma or point as the decimal mark, fractions
 * ("1 1/4", "1-1/4"), spaces between thousands, and a unit behind the number ("0.5in", "5 thou").
 *
 * A mark that may be decimal or grouping is refused, never guessed: "1,234.5" always, and "23,000" where
 * values run to thousands (rpm, ft/min, m/min). Ranges are not judged here. Never throws, never gives NaN.
 *
 * @param text - as typed.
 * @param wanted - the unit the value is wanted in.
 * @param bare - the unit a bare number is taken to be in; it measures the same thing as `wanted`.
 * @returns the value in `wanted`, unrounded, and the unit it was typed in; or the reason it was refused.
 * @source nist-sp-811
 * @example parseQuantity('1 1/4', 'mm', 'in') // { ok: true, value: 31.75, unit: 'in' }
 * @example parseQuantity('1,234.5', 'mm', 'mm') // { ok: false, reason: 'ambiguous' }
 */
export function parseQuantity(text: string, wanted: UnitName, bare: EntryUnit): ParsedQuantity {
  const tidy = tidied(text);
  if (tidy === '') return { ok: false, reason: 'empty' };
  const sign = tidy.startsWith('-') ? -1 : 1;
  const unsigned = tidy.replace(/^[+-] ?/, '');

  const angle = wanted === 'deg' && DEGREES_AND_MINUTES.exec(unsigned);
  if (angle) {
    const value = Number(angle[1]) + decimal(angle[2] ?? '') / 60;
    return { ok: true, value: sign * value, unit: 'deg' };
  }

  const token = numberToken(unsigned);
  const unitText = unsigned.slice(token.length);
  const unit = unitText.trim() === '' ? bare : unitSpelt(unitText, wanted);
  if (unit === null) return { ok: false, reason: 'unreadable' };
  if (!sameMeasure(unit, wanted)) return { ok: false, reason: 'wrong unit' };

  const reading = readNumber(token, RUNS_TO_THOUSANDS.includes(unit));
  if (!reading.ok) return reading;
  const value = convertUnit(sign * reading.value, unit, wanted) + 0;
  return Number.isFinite(value) ? { ok: true, value, unit } : { ok: false, reason: 'unreadable' };
}

function tidied(text: string): string {
  return text
    .replace(VULGAR_FRACTION, (sign) => ` ${sign.normalize('NFKC').replace('\u2044', '/')}`)
    .replace(MINUS_SIGNS, '-')
    .replace(SPACES, ' ')
    .trim();
}

function numberToken(text: string): string {
  return (FRACTION.exec(text) ?? GROUPED.exec(text) ?? DIGITS_AND_MARKS.exec(text))?.[0] ?? '';
}

function readNumber(token: string, runsToThousands: boolean): Reading {
  const [, whole = '0', above, below] = FRACTION.exec(token) ?? [];
  if (above !== undefined) return finite(Number(whole) + Number(above) / Number(below));
  if (GROUPED.test(token)) return finite(decimal(token.replaceAll(' ', '')));
  if (runsToThousands && THREE_AFTER_MARK.test(token)) return { ok: false, reason: 'ambiguous' };
  if (DECIMAL.test(token)) return finite(decimal(token));
  return { ok: false, reason: MIXED_MARKS.test(token) ? 'ambiguous' : 'unreadable' };
}

function finite(value: number): Reading {
  return Number.isFinite(value) ? { ok: true, value } : { ok: false, reason: 'unreadable' };
}

function decimal(token: string): number {
  return Number(token.replace(',', '.'));
}

/** Units may share a spelling ("lb"): the one that measures what is wanted comes first. */
function unitSpelt(text: string, wanted: UnitName): EntryUnit | null {
  const units = UNITS_BY_SPELLING.get(spelling(text)) ?? [];
  return units.find((unit) => sameMeasure(unit, wanted)) ?? units[0] ?? null;
}

function spelling(text: string): string {
  return text
    .toLowerCase()
    .replace(/[.·]/g, '')
    .replace(/ ?\/ ?/, '/')
    .trim()
    .replaceAll('²', '2')
    .replaceAll('³', '3')
    .replaceAll('μ', 'µ');
}

const UNITS_BY_SPELLING = unitsBySpelling();

function unitsBySpelling(): ReadonlyMap<string, readonly EntryUnit[]> {
  const bySpelling = new Map<string, EntryUnit[]>();
  for (const unit of Object.keys(ENTRY_UNITS) as EntryUnit[]) {
    const { label, spellings } = ENTRY_UNITS[unit];
    for (const text of new Set([unit, label, ...spellings].map(spelling))) {
      bySpelling.set(text, [...(bySpelling.get(text) ?? []), unit]);
    }
  }
  return bySpelling;
}
