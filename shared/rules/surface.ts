import type { PlanInput } from '../domain/setups';
import { toRadians } from './angles';
import { coneOf, type Cone } from './cone';
import { positive } from './sizes';

/** The surface to be ground, the same way for every operation; null where it is not known yet. */
export interface Surface {
  side: 'outside' | 'inside';
  /** Where the work runs fastest: of a cone its big end. */
  diameterMm: number | null;
  /** The narrowest place: of a cone its small end. */
  leastDiameterMm: number | null;
  /** The cylinder that curves as the surface does where the wheel touches it. */
  contactDiameterMm: number | null;
  /** Along the surface: of a cone its slant. */
  lengthMm: number | null;
  /** The wheel leaves the work and meets it again within one turn. */
  interrupted: boolean;
  /** Ends at which a shoulder stops the wheel. */
  shoulders: 0 | 1 | 2;
  /** Depth of cut, square to the surface, for each millimetre that the cross-slide feeds; 1 on cylinders. */
  depthPerInfeed: number | null;
  /** The slide that carries the wheel along the surface; the compound has no feed of its own. */
  slide: 'carriage' | 'compound';
  /** Null for cylinders. */
  cone: Cone | null;
}

/** What the surface is like to guard and to reach, whatever its form. */
export type SurfaceKind = 'jaws' | 'bore' | 'outside';

/**
 * A taper counts as a shaft outside and as a bore inside.
 *
 * @param input - operation and work.
 * @returns the kind of surface.
 */
export function kindOf({ operation, work }: Pick<PlanInput, 'operation' | 'work'>): SurfaceKind {
  if (operation !== 'taper') return operation;
  return work.taperSide === 'outside' ? 'outside' : 'bore';
}

/**
 * Reads the ground surface out of the fields that its operation uses.
 *
 * @param input - operation and work.
 * @returns the surface.
 */
export function surfaceOf({ operation, work }: Pick<PlanInput, 'operation' | 'work'>): Surface {
  if (operation === 'taper') return coneSurface(work);
  const jaws = operation === 'jaws';
  const diameterMm = positive(jaws ? work.jawBoreMm : work.diameterMm);
  return {
    side: operation === 'outside' ? 'outside' : 'inside',
    diameterMm,
    leastDiameterMm: diameterMm,
    contactDiameterMm: diameterMm,
    lengthMm: positive(work.lengthMm),
    interrupted: jaws || work.interrupted,
    shoulders: jaws ? 0 : shouldersOf(work),
    depthPerInfeed: 1,
    slide: 'carriage',
    cone: null,
  };
}

function coneSurface(work: PlanInput['work']): Surface {
  const cone = coneOf(work);
  const diameterMm = positive(work.diameterMm);
  const half = cone.half.value;
  const cosine = half === null ? null : Math.cos(toRadians(half));
  return {
    side: work.taperSide,
    diameterMm,
    leastDiameterMm: positive(cone.smallDiameter.value),
    contactDiameterMm: diameterMm === null || cosine === null ? null : diameterMm / cosine,
    lengthMm: positive(cone.slantLength.value),
    interrupted: work.interrupted,
    shoulders: shouldersOf(work),
    // With the tailstock set over, the ground side lies along the bed and is fed square to itself.
    depthPerInfeed: work.taperMethod === 'tailstock' ? 1 : cosine,
    slide: work.taperMethod === 'tailstock' ? 'carriage' : 'compound',
    cone,
  };
}

function shouldersOf({ shoulders }: PlanInput['work']): Surface['shoulders'] {
  if (shoulders === 'none') return 0;
  return shoulders === 'one end' ? 1 : 2;
}

/**
 * Depth of cut, square to the surface, of a move of the slide that feeds.
 *
 * @param surface - the ground surface.
 * @param infeedMm - move of the cross-slide, mm.
 * @returns mm; the move itself on cylinders.
 */
export function squareTo(
  { depthPerInfeed }: Pick<Surface, 'depthPerInfeed'>,
  infeedMm: number | null,
): number | null {
  return infeedMm === null || depthPerInfeed === null ? null : infeedMm * depthPerInfeed;
}
