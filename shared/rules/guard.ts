import type { GrinderData } from '../domain/machines';
import { finding } from './findings';
import { quantity } from './figures';
import type { SurfaceKind } from './surface';
import type { Finding } from './types';

/**
 * Whether the open wheel is covered well enough for the work.
 *
 * Outside work needs a guard on the grinder. A bore is itself the guard while the wheel stays inside, that is
 * while the overrun is less than the wheel's width. Jaws have gaps, which a fixed shield around them cures.
 *
 * @param spec - kind of surface, grinder (null while not chosen), whether a fixed shield stands, overrun and wheel
 * width in mm (null while unknown).
 * @returns findings, none when the wheel is covered.
 * @source osha-1910-215-a1
 * @example guardFindings({ kind: 'jaws', grinder, shieldFitted: true, overrunMm: 4, widthMm: 12 }) // []
 */
export function guardFindings(spec: {
  kind: SurfaceKind;
  grinder: GrinderData | null;
  shieldFitted: boolean;
  overrunMm: number | null;
  widthMm: number | null;
}): Finding[] {
  const { kind, grinder, shieldFitted, overrunMm, widthMm } = spec;
  if (kind === 'outside')
    return grinder !== null && grinder.guard === 'none' ? [finding('guard-missing')] : [];
  if (shieldFitted) return [];
  if (overrunMm !== null && widthMm !== null && overrunMm >= widthMm)
    return [
      finding('wheel-leaves-work', {
        figures: { overrun: quantity(overrunMm, 'mm'), width: quantity(widthMm, 'mm') },
      }),
    ];
  return kind === 'jaws' ? [finding('jaws-open')] : [];
}
