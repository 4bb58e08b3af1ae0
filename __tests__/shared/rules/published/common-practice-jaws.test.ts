/**
 * Common practice, no source: a three-jaw chuck that indicated 0.004 to 0.005 in, ground about a thousandth a
 * pass, had all jaws touching after about 0.003 in and was clean within one more thousandth.
 */
import { planJaws } from '@/shared/rules/jaws';
import { offsetFromRunOut } from '@/shared/rules/offset';
import { commonPracticeJaws } from '@/shared/rules/published/common-practice-jaws';

import { checkPublished } from '../../../support/published';

checkPublished(commonPracticeJaws);

const THOU = 0.0254;

function grind(runOutThou: number, highSpotDeg: number, padWidthMm: number) {
  const plan = planJaws({
    jawCount: 3,
    boreMm: 50,
    padWidthMm,
    padBackMm: 0,
    padFrontMm: 40,
    lastGroundMm: null,
    offset: {
      at0: offsetFromRunOut(runOutThou * THOU, highSpotDeg),
      perMm: { aMm: 0, bMm: 0 },
    },
    padErrors: [],
  });
  const touches = plan?.contacts.map(({ touchesAtMm }) => touchesAtMm) ?? [];
  return {
    allTouch: Math.max(...touches) / THOU,
    clean: (plan?.cleanUp.value ?? NaN) / THOU,
  };
}

const everyWay = (padWidthMm: number) =>
  [4, 4.5, 5].flatMap((runOut) =>
    Array.from({ length: 120 }, (_, deg) => grind(runOut, deg, padWidthMm)),
  );

describe('truing a three-jaw chuck (common practice, no source)', () => {
  it('cleans up a run-out of 0.004 to 0.005 in after 0.0030 to 0.0043 in, with narrow jaws', () => {
    const stocks = everyWay(0).map(({ clean }) => clean);
    expect(Math.min(...stocks)).toBeCloseTo(3.0, 1);
    expect(Math.max(...stocks)).toBeCloseTo(4.3, 1);
  });

  it('has all jaws touching after 0.003 in and some, and clean within one more thousandth', () => {
    for (const { allTouch, clean } of everyWay(10)) {
      expect(allTouch).toBeGreaterThan(2.5);
      expect(allTouch).toBeLessThan(4.5);
      expect(clean - allTouch).toBeLessThan(1);
    }
  });
});
