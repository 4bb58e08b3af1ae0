import { finite } from './figures';

/**
 * A number over 0, or null: nothing else can be a size, a speed or a feed.
 *
 * @param value - any number, or none.
 * @returns the number, over 0, or null.
 */
export function positive(value: number | null): number | null {
  const known = finite(value);
  return known !== null && known > 0 ? known : null;
}

/**
 * A number of 0 or more, or null: run-out and distances may be nothing at all.
 *
 * @param value - any number, or none.
 * @returns the number, 0 or more, or null.
 */
export function notNegative(value: number | null): number | null {
  const known = finite(value);
  return known !== null && known >= 0 ? known : null;
}
