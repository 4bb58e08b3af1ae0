import { toRadians } from '../angles';
import { planJaws } from '../jaws';
import { fitRunout, type RunoutFit } from '../runout';
import { casesOf } from './case';
import type { NumberCheck } from './types';

const READINGS = [111, 112, 109, 107, 104, 96, 89, 88, 91, 93, 96, 104];
const WITHIN = { within: 0.0000005 };

function fitted(pick: (fit: RunoutFit) => number | null): () => number | null {
  return () => {
    const fit = fitRunout(READINGS.map((readingMm, i) => ({ angleDeg: 30 * i, readingMm })));
    return fit === null ? null : pick(fit);
  };
}

const reading = (checks: string, expected: number, got: () => number | null): NumberCheck => ({
  checks,
  inputs: READINGS.join(', ').concat(' at every 30°'),
  expected,
  unit: '',
  tolerance: WITHIN,
  got,
});

const leastSquares = casesOf('derived-least-squares', [
  reading(
    'Mean reading',
    100,
    fitted(({ meanMm }) => meanMm),
  ),
  reading(
    'Offset along 0°, a',
    9.118802,
    fitted(({ aMm }) => aMm),
  ),
  reading(
    'Offset along 90°, b',
    7.419443,
    fitted(({ bMm }) => bMm),
  ),
  reading(
    'Eccentricity, e',
    11.755879,
    fitted((fit) => fit.eccentricity.value),
  ),
  reading(
    'Out of round',
    4.267949,
    fitted((fit) => fit.outOfRound.value),
  ),
]);

/** Offset of one thousandth of the bore's radius, so that the first order is all there is. */
function stock(offsetDeg: number, halfPadDeg: number): number | null {
  const boreMm = 2000;
  const plan = planJaws({
    jawCount: 3,
    boreMm,
    padWidthMm: boreMm * Math.sin(toRadians(halfPadDeg)),
    padBackMm: 0,
    padFrontMm: 30,
    lastGroundMm: null,
    offset: {
      at0: { aMm: Math.cos(toRadians(offsetDeg)), bMm: Math.sin(toRadians(offsetDeg)) },
      perMm: { aMm: 0, bMm: 0 },
    },
    padErrors: [],
  });
  return plan?.cleanUp.value ?? null;
}

const JAWS: readonly [halfPadDeg: number, offsetDeg: number, stock: number, within: number][] = [
  [0, 0, 1.5, 0.000005],
  [0, 30, 1.73205, 0.000005],
  [10, 0, 1.643, 0.0005],
  [10, 30, 1.879, 0.0005],
  [20, 0, 1.766, 0.0005],
  [20, 30, 1.97, 0.0005],
];

const jaws = casesOf(
  'derived-jaw-contact',
  JAWS.map(([halfPadDeg, offsetDeg, expected, within]) => ({
    checks: 'Stock on radius until three jaws are clean',
    inputs: `${halfPadDeg === 0 ? 'narrow jaws' : `pads ${halfPadDeg}° either side`}, offset e ${
      offsetDeg === 0 ? 'toward a jaw' : `${offsetDeg}° from a jaw`
    }`,
    expected,
    unit: 'e',
    tolerance: { within },
    got: () => stock(offsetDeg, halfPadDeg),
  })),
);

export const firstPrinciplesRunOut = [...leastSquares, ...jaws];
