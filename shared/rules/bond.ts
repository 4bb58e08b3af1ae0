import { parseMarking, type ConventionalBond, type WheelMarking } from './marking';

const ORGANIC: readonly ConventionalBond[] = ['E', 'R', 'RF', 'B', 'BF', 'PL'];

/**
 * The marking as read; null where there is none, or it does not read.
 *
 * @param text - the marking as written.
 * @returns its parts.
 */
export function markingOf(text: string | null): WheelMarking | null {
  const parsed = text === null ? null : parseMarking(text);
  return parsed?.ok === true ? parsed.marking : null;
}

/**
 * Whether a wheel's bond is of rubber, resin, shellac or plastic, which do not ring as vitrified ones do.
 *
 * @param marking - the wheel's marking; null while unknown.
 * @returns null where the marking does not tell.
 * @source iso-525
 * @example isOrganic(markingOf('A 60 K 8 B')) // true
 */
export function isOrganic(marking: WheelMarking | null): boolean | null {
  if (marking === null) return null;
  return marking.kind === 'conventional' ? ORGANIC.includes(marking.bond) : marking.bond === 'B';
}
