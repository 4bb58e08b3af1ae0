import type { PlanInput } from '../domain/setups';
import { finite } from './figures';

/** The surface to be ground, the same way for every operation; null where it is not known yet. */
export interface Surface {
  side: 'outside' | 'inside';
  diameterMm: number | null;
  lengthMm: number | null;
  /** The wheel leaves the work and meets it again within one turn. */
  interrupted: boolean;
}

/**
 * Reads the ground surface out of the fields that its operation uses.
 *
 * @param input - operation and work.
 * @returns the surface.
 */
export function surfaceOf({ operation, work }: Pick<PlanInput, 'operation' | 'work'>): Surface {
  const jaws = operation === 'jaws';
  return {
    side: operation === 'outside' ? 'outside' : 'inside',
    diameterMm: positive(jaws ? work.jawBoreMm : work.diameterMm),
    lengthMm: positive(work.lengthMm),
    interrupted: jaws || work.interrupted,
  };
}

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
