/** From first principles, checked numerically: run-out and jaws. */
import { planJaws } from '@/shared/rules/jaws';
import { fitRunout } from '@/shared/rules/runout';

describe('a set of twelve readings at 30 degrees (derived)', () => {
  const fit = fitRunout(
    [111, 112, 109, 107, 104, 96, 89, 88, 91, 93, 96, 104].map((readingMm, i) => ({
      angleDeg: 30 * i,
      readingMm,
    })),
  );

  it('fits a circle of mean 100 that is 11.755879 off centre', () => {
    expect(fit?.meanMm).toBeCloseTo(100, 6);
    expect(fit?.aMm).toBeCloseTo(9.118802, 6);
    expect(fit?.bMm).toBeCloseTo(7.419443, 6);
    expect(fit?.eccentricity.value).toBeCloseTo(11.755879, 6);
  });

  it('is 4.267949 out of round', () => {
    expect(fit?.outOfRound.value).toBeCloseTo(4.267949, 6);
  });
});

describe('three narrow jaws off the axis by e (derived)', () => {
  const stock = (deg: number) => {
    const angle = (deg * Math.PI) / 180;
    const plan = planJaws({
      jawCount: 3,
      boreMm: 80,
      padWidthMm: 0,
      padBackMm: 0,
      padFrontMm: 30,
      lastGroundMm: null,
      offset: { at0: { aMm: Math.cos(angle), bMm: Math.sin(angle) }, perMm: { aMm: 0, bMm: 0 } },
      padErrors: [],
    });
    return plan?.cleanUp.value;
  };

  it('clean up in 1.5 e with the offset toward a jaw', () => {
    expect(stock(0)).toBeCloseTo(1.5, 9);
  });

  it('clean up in 1.73205 e with the offset 30 degrees from a jaw', () => {
    expect(stock(30)).toBeCloseTo(1.73205, 5);
  });
});
