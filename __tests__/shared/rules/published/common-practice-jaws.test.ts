/**
 * Common practice, no source: a three-jaw chuck that indicated 0.004 to 0.005 in, ground about a thousandth a
 * pass, had all jaws touching after about 0.003 in and was clean within one more thousandth.
 */
import { planJaws } from '@/shared/rules/jaws';
import { offsetFromRunOut } from '@/shared/rules/offset';

const THOU = 0.0254;

function cleanUpThou(runOutThou: number, highSpotDeg: number): number {
  const plan = planJaws({
    jawCount: 3,
    boreMm: 50,
    padWidthMm: 0,
    padBackMm: 0,
    padFrontMm: 40,
    lastGroundMm: null,
    offset: {
      at0: offsetFromRunOut(runOutThou * THOU, highSpotDeg),
      perMm: { aMm: 0, bMm: 0 },
    },
    padErrors: [],
  });
  return (plan?.cleanUp.value ?? NaN) / THOU;
}

describe('truing a three-jaw chuck (common practice, no source)', () => {
  const stocks = [4, 5].flatMap((runOut) =>
    Array.from({ length: 120 }, (_, deg) => cleanUpThou(runOut, deg)),
  );

  it('cleans up a run-out of 0.004 to 0.005 in after 0.0030 to 0.0043 in', () => {
    expect(Math.min(...stocks)).toBeCloseTo(3.0, 1);
    expect(Math.max(...stocks)).toBeCloseTo(4.3, 1);
  });

  it('is clean within a thousandth of the infeed at which the last jaw was seen to touch', () => {
    expect(Math.min(...stocks)).toBeGreaterThanOrEqual(3.0 - 1e-9);
    expect(Math.max(...stocks)).toBeLessThanOrEqual(3 + 1 + 0.5);
  });
});
