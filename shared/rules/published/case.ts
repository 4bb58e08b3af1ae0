import { entryText, formatQuantity } from '../../units/format';
import type { SourceId } from '../sources';
import type { NumberCheck, Outcome, PublishedCase, PublishedCheck, Tolerance } from './types';

/** Doubles carry about sixteen figures; nine of them are taken for exact. */
const EXACT_SHARE = 1e-9;
const EXACT_DIGITS = 9;
const MOST_DIGITS = 12;

/**
 * Checks that rest on one source.
 *
 * @param source - id in the registry, which carries the mark.
 * @param checks - what the source states, and what the rules answer.
 * @returns the cases, in the same order.
 */
export function casesOf(source: SourceId, checks: readonly PublishedCheck[]): PublishedCase[] {
  return checks.map((check) => ({ ...check, source }));
}

/**
 * Whether a check compares numbers; the others compare words.
 *
 * @param check - any check.
 * @returns true for numbers.
 */
export function isNumberCheck<Check extends PublishedCheck>(
  check: Check,
): check is Extract<Check, NumberCheck> {
  return typeof check.expected === 'number';
}

/**
 * How far the answer to a check may be off.
 *
 * @param check - what the source states.
 * @returns the largest difference, in the unit of the check, 0 or more.
 * @example allowance({ expected: 0.273, tolerance: { share: 0.012 } }) // 0.003276
 */
export function allowance({
  expected,
  tolerance,
}: Pick<NumberCheck, 'expected' | 'tolerance'>): number {
  if (tolerance === 'exact') return EXACT_SHARE * Math.abs(expected);
  return 'within' in tolerance ? tolerance.within : tolerance.share * Math.abs(expected);
}

/**
 * Asks the rules and holds their answer against the source's. A rule that throws has no answer.
 *
 * @param check - one check.
 * @returns the answer, and whether it agrees.
 */
export function judge(check: PublishedCheck): Outcome {
  if (!isNumberCheck(check)) {
    const got = answer(check.got);
    return { got, ok: got === check.expected };
  }
  const got = answer(check.got);
  // What doubles cannot tell apart must not decide on the edge of a tolerance.
  const most = allowance(check) + EXACT_SHARE * Math.abs(check.expected);
  return { got, ok: got !== null && Math.abs(got - check.expected) <= most };
}

function answer<Value>(got: () => Value): Value | null {
  try {
    return got();
  } catch {
    return null;
  }
}

/**
 * What the source states, as it writes it.
 *
 * @param check - one check.
 * @returns number and unit, or words.
 */
export function expectedWords(check: PublishedCheck): string {
  if (!isNumberCheck(check)) return check.expected;
  const plain = check.printed ?? literal(check.expected);
  return withUnit(plain, check.unit);
}

/**
 * What the rules answered, with one digit more than the source's rounding deserves.
 *
 * @param check - the check.
 * @param got - from judge.
 * @returns number and unit, or words; "no answer" for null.
 */
export function gotWords(check: PublishedCheck, got: Outcome['got']): string {
  if (got === null) return 'no answer';
  if (typeof got === 'string' || !isNumberCheck(check)) return String(got);
  return withUnit(written(got, digitsOf(check)), check.unit);
}

/**
 * The tolerance of a check in words.
 *
 * @param check - the check.
 * @returns "±0.5 rpm", "±1.2 %", "exact", or "as written" for words.
 * @example toleranceWords({ checks: 'a', inputs: 'b', expected: 1, unit: 'rpm', tolerance: 'exact', got: () => 1 }) // 'exact'
 */
export function toleranceWords(check: PublishedCheck): string {
  if (!isNumberCheck(check)) return 'as written';
  const { tolerance, unit } = check;
  if (tolerance === 'exact') return 'exact';
  return 'within' in tolerance
    ? withUnit(`±${literal(tolerance.within)}`, unit)
    : withUnit(`±${written(100 * tolerance.share, 3)}`, '%');
}

const written = (value: number, digits: number) =>
  formatQuantity({ value, unit: '1' }, 'mm', { digits });

/** A number with the decimals it was written with. */
const literal = (value: number) =>
  written(value, entryText(value, '1', 'mm').split('.')[1]?.length ?? 0);

const withUnit = (text: string, unit: string) => (unit === '' ? text : `${text}\u00a0${unit}`);

/** Decimals that show one digit beyond the tolerance. */
function digitsOf(check: NumberCheck): number {
  if (isExact(check.tolerance)) {
    const size = Math.floor(Math.log10(Math.abs(check.expected) || 1));
    return Math.min(Math.max(EXACT_DIGITS - 1 - size, 0), MOST_DIGITS);
  }
  const digits = 1 - Math.floor(Math.log10(allowance(check)));
  return Math.min(Math.max(digits, 0), MOST_DIGITS);
}

const isExact = (tolerance: Tolerance) => tolerance === 'exact';
