import { figure, term } from './figures';
import type { Figure } from './types';

/**
 * The radius that a wheel grinds when its centre is not at the height of the work's.
 *
 * @param wheel - horizontal distance X of the centres and height off centre h, mm, and the wheel's radius, mm.
 * @param side - 'outside' for shafts, 'inside' for bores.
 * @returns radius of the work, mm, unrounded; null when the wheel would reach past the axis.
 * @source derived-centre-height
 * @example groundRadius({ acrossMm: 60, heightMm: 0, wheelRadiusMm: 40 }, 'outside').value // 20 mm
 */
export function groundRadius(
  wheel: { acrossMm: number | null; heightMm: number | null; wheelRadiusMm: number | null },
  side: 'outside' | 'inside',
): Figure {
  const outside = side === 'outside';
  return figure({
    unit: 'mm',
    formula: `{r} = √({X}² + {h}²) ${outside ? '-' : '+'} {R_s}`,
    source: 'derived-centre-height',
    terms: [
      term('X', 'across, from axis to axis', [wheel.acrossMm, 'mm']),
      term('h', 'height off centre', [wheel.heightMm, 'mm']),
      term('R_s', 'radius of the wheel', [wheel.wheelRadiusMm, 'mm']),
    ],
    compute: (across, height, radius) => {
      const ground = Math.hypot(across, height) + (outside ? -radius : radius);
      return ground > 0 ? ground : null;
    },
  });
}

/**
 * What share of a cross-slide move reaches the work as infeed when the wheel is off centre height.
 *
 * @param acrossMm - horizontal distance of the centres, mm.
 * @param heightMm - height off centre, mm, either way.
 * @returns 1 on centre, less off it.
 * @source derived-centre-height
 * @example infeedGain(40, 30).value // 0.8
 */
export function infeedGain(acrossMm: number | null, heightMm: number | null): Figure {
  return figure({
    unit: '1',
    formula: '{X} / √({X}² + {h}²)',
    source: 'derived-centre-height',
    terms: [
      term('X', 'across, from axis to axis', [acrossMm, 'mm']),
      term('h', 'height off centre', [heightMm, 'mm']),
    ],
    compute: (across, height) => across / Math.hypot(across, height),
  });
}

export interface Shim {
  thicknessMm: number;
  /** How many the shop has of it. */
  count: number;
}

export interface ShimStack {
  /** Thickest first. */
  piecesMm: number[];
  heightMm: number;
}

/** A stack of more pieces than this would be too springy to stand a grinder on. */
const MOST_PIECES = 6;

/**
 * The fewest shims that make a height, and among as many pieces the nearest.
 *
 * @param heightMm - height wanted, mm, 0 or more.
 * @param toleranceMm - how far off the stack may be, mm, 0 or more.
 * @param shims - thicknesses and how many there are of each, mm, over 0.
 * @returns the stack, empty when nothing is needed; null when no stack of up to six pieces comes near enough.
 * @source derived-shims
 * @example shimStack(1.3, 0.01, [{ thicknessMm: 1, count: 2 }, { thicknessMm: 0.25, count: 1 }, { thicknessMm: 0.05, count: 4 }])?.piecesMm // [1, 0.25, 0.05]
 */
export function shimStack(
  heightMm: number,
  toleranceMm: number,
  shims: readonly Shim[],
): ShimStack | null {
  if (Math.abs(heightMm) <= toleranceMm) return { piecesMm: [], heightMm: 0 };
  const stock = shims.filter(({ thicknessMm, count }) => thicknessMm > 0 && count > 0);
  stock.sort((one, other) => other.thicknessMm - one.thicknessMm);
  for (let pieces = 1; pieces <= MOST_PIECES; pieces += 1) {
    const found = nearestStack({ heightMm, toleranceMm, stock }, pieces);
    if (found !== null) return found;
  }
  return null;
}

interface Wanted {
  heightMm: number;
  toleranceMm: number;
  /** Thickest first. */
  stock: readonly Shim[];
}

/** The stack of exactly so many pieces that comes nearest within the tolerance. */
function nearestStack({ heightMm, toleranceMm, stock }: Wanted, pieces: number): ShimStack | null {
  let best: ShimStack | null = null;
  const slack = 1e-9;
  const search = (row: number, chosen: number[], soFar: number) => {
    const left = pieces - chosen.length;
    if (left === 0) {
      const off = Math.abs(soFar - heightMm);
      if (off <= toleranceMm + slack && (best === null || off < Math.abs(best.heightMm - heightMm)))
        best = { piecesMm: chosen, heightMm: soFar };
      return;
    }
    const shim = stock[row];
    // Nothing thicker follows: the rest cannot reach, or the stack is too high already.
    if (shim === undefined || soFar > heightMm + toleranceMm + slack) return;
    if (soFar + left * shim.thicknessMm < heightMm - toleranceMm - slack) return;
    for (let taken = Math.min(shim.count, left); taken >= 0; taken -= 1) {
      const added = Array.from({ length: taken }, () => shim.thicknessMm);
      search(row + 1, [...chosen, ...added], soFar + taken * shim.thicknessMm);
    }
  };
  search(0, [], 0);
  return best;
}
