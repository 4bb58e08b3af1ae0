import type { GrinderData } from '../domain/machines';
import type { Operation } from '../domain/setups';
import { finding } from './findings';
import { quantity } from './figures';
import type { Finding } from './types';

/**
 * Whether the open wheel is covered well enough for the operation.
 *
 * Outside work needs a guard on the grinder. A bore is itself the guard while the wheel stays inside, that is
 * while the overrun is less than the wheel's width. Jaws have gaps, which a fixed shield around them cures.
 *
 * @param spec - operation, grinder (null while not chosen), whether a fixed shield stands, overrun and wheel
 * width in mm (null while unknown).
 * @returns findings, none when the wheel is covered.
 * @source osha-1910-215-a1
 * @example guardFindings({ operation: 'jaws', grinder, shieldFitted: true, overrunMm: 4, widthMm: 12 }) // []
 */
export function guardFindings(spec: {
  operation: Operation;
  grinder: GrinderData | null;
  shieldFitted: boolean;
  overrunMm: number | null;
  widthMm: number | null;
}): Finding[] {
  const { operation, grinder, shieldFitted, overrunMm, widthMm } = spec;
  if (operation === 'outside')
    return grinder !== null && grinder.guard === 'none' ? [finding('guard-missing')] : [];
  if (shieldFitted) return [];
  if (overrunMm !== null && widthMm !== null && overrunMm >= widthMm)
    return [
      finding('wheel-leaves-work', {
        figures: { overrun: quantity(overrunMm, 'mm'), width: quantity(widthMm, 'mm') },
      }),
    ];
  return operation === 'jaws' ? [finding('jaws-open')] : [];
}
