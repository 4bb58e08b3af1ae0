import fc from 'fast-check';

import { bellMouth, planJaws, type JawChuck } from '@/shared/rules/jaws';

const level = (aMm: number, bMm: number) => ({ at0: { aMm, bMm }, perMm: { aMm: 0, bMm: 0 } });
const toward = (e: number, deg: number) =>
  level(e * Math.cos((deg * Math.PI) / 180), e * Math.sin((deg * Math.PI) / 180));

const chuck = (changes: Partial<JawChuck>): JawChuck => ({
  jawCount: 3,
  boreMm: 60,
  padWidthMm: 0,
  padBackMm: 0,
  padFrontMm: 40,
  lastGroundMm: null,
  offset: toward(0.05, 0),
  padErrors: [],
  ...changes,
});

/** A pad of half-angle A, in degrees, in a bore. */
const width = (halfDeg: number, boreMm = 60) => boreMm * Math.sin((halfDeg * Math.PI) / 180);
const cleanUpOverE = (changes: Partial<JawChuck>) =>
  (planJaws(chuck(changes))?.cleanUp.value ?? NaN) / 0.05;

describe('chuck jaws off the axis', () => {
  it('touch first where the offset points away from, and last where it points to', () => {
    const plan = planJaws(chuck({}));
    expect(plan?.contacts.map(({ jaw, order }) => [jaw, order])).toEqual([
      [1, 3],
      [2, 1],
      [3, 2],
    ]);
    expect(plan?.contacts[0]?.touchesAtMm).toBeCloseTo(0.075, 9);
    expect(plan?.contacts[0]?.cleanAtMm).toBeCloseTo(0.075, 9);
    expect(plan?.contacts[1]?.touchesAtMm).toBeCloseTo(0, 12);
    expect(plan?.contacts.map(({ angleDeg }) => angleDeg)).toEqual([0, 120, 240]);
  });

  it('are first met at the bore less the offset of the first jaw', () => {
    expect(planJaws(chuck({}))?.firstContactDiameterMm).toBeCloseTo(60 - 0.05, 9);
  });

  it('need nothing off when they run true', () => {
    const plan = planJaws(chuck({ offset: level(0, 0) }));
    expect(plan?.cleanUp.value).toBeCloseTo(0, 12);
    expect(plan?.contacts.every(({ touchesAtMm }) => touchesAtMm === 0)).toBe(true);
  });

  it('need twice the offset in four narrow jaws with one on the high spot', () => {
    expect(cleanUpOverE({ jawCount: 4 })).toBeCloseTo(2, 9);
    expect(cleanUpOverE({ jawCount: 4, offset: toward(0.05, 45) })).toBeCloseTo(Math.SQRT2, 9);
  });

  it.each([
    [10, 1.643, 1.879],
    [20, 1.766, 1.97],
  ])('with pads of half-angle %d need %d e to %d e', (half, least, most) => {
    const stocks = Array.from({ length: 121 }, (_, deg) =>
      cleanUpOverE({ padWidthMm: width(half), offset: toward(0.05, deg) }),
    );
    expect(Math.min(...stocks)).toBeCloseTo(least, 3);
    expect(Math.max(...stocks)).toBeCloseTo(most, 3);
  });

  it('need at most twice the offset, and at least one and a half times (four √2), when they are alike', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: 3, max: 12 }),
        fc.double({ min: 0, max: 30, noNaN: true }),
        fc.double({ min: 0, max: 360, noNaN: true }),
        (jawCount, padWidthMm, deg) => {
          const stock = cleanUpOverE({ jawCount, padWidthMm, offset: toward(0.05, deg) });
          return stock >= (jawCount === 4 ? Math.SQRT2 : 1.5) - 1e-9 && stock <= 2 + 1e-9;
        },
      ),
    );
  });

  it('need the same when everything turns by one jaw, and a mirror image of it', () => {
    const anglesDeg = fc.double({ min: 0, max: 360, noNaN: true });
    fc.assert(
      fc.property(anglesDeg, fc.double({ min: 0, max: 20, noNaN: true }), (deg, padWidthMm) => {
        const stocks = [deg, deg + 120, -deg].map((angle) =>
          cleanUpOverE({ padWidthMm, offset: toward(0.05, angle) }),
        );
        return Math.max(...stocks) - Math.min(...stocks) < 1e-7;
      }),
    );
  });

  it('need more when they are tilted, by what the tilt adds at the worse end', () => {
    const tilted = { at0: { aMm: 0.02, bMm: 0 }, perMm: { aMm: 0.001, bMm: 0 } };
    const plan = planJaws(chuck({ offset: tilted }));
    expect(plan?.cleanUp.value).toBeCloseTo(1.5 * 0.06, 9);
    expect(plan?.tilt.value).toBeCloseTo(0.04, 9);
    expect(plan?.eccentricityMm).toBeCloseTo(0.06, 9);
    expect(plan?.contacts[0]?.touchesAtMm).toBeCloseTo(0.03 + 0.02, 9);
    expect(plan?.contacts[0]?.cleanAtMm).toBeCloseTo(0.09, 9);
  });

  it('need what is worn away at the front on top of the offset', () => {
    const plan = planJaws(chuck({ padErrors: bellMouth(3, 0.02) }));
    expect(plan?.cleanUp.value).toBeCloseTo(0.075 + 0.02, 9);
    const true_ = planJaws(chuck({ offset: level(0, 0), padErrors: bellMouth(3, 0.02) }));
    expect(true_?.cleanUp.value).toBeCloseTo(0.02, 9);
    expect(true_?.contacts.map(({ touchesAtMm }) => touchesAtMm)).toEqual([0, 0, 0]);
  });

  it('take a long jaw first', () => {
    const padErrors = [
      { backMm: -0.3, frontMm: -0.3 },
      { backMm: 0, frontMm: 0 },
      { backMm: 0, frontMm: 0 },
    ];
    const plan = planJaws(chuck({ padErrors }));
    expect(plan?.contacts[0]?.order).toBe(1);
    expect(plan?.cleanUp.value).toBeCloseTo(0.3 - 0.05 - 0.025, 9);
  });

  it('bow when last ground at another diameter, by about w²/2 (1/R - 1/R_old)', () => {
    const stock = (lastGroundMm: number) =>
      planJaws(chuck({ offset: level(0, 0), padWidthMm: 16, lastGroundMm }))?.cleanUp.value ?? NaN;
    const corner = (last: number) => Math.hypot(30 - last + Math.sqrt(last ** 2 - 64), 8) - 30;
    expect(stock(66)).toBeCloseTo(corner(33), 12);
    expect(stock(54)).toBeCloseTo(-corner(27), 12);
    expect(stock(60)).toBeCloseTo(0, 12);
    expect(stock(66) / (32 * (1 / 30 - 1 / 33))).toBeCloseTo(1, 1);
    expect(stock(54) / (32 * (1 / 27 - 1 / 30))).toBeCloseTo(1, 1);
  });

  it('say when the last diameter is not known', () => {
    expect(planJaws(chuck({}))?.cleanUp.working.note).toMatch(/last ground at this diameter/);
    expect(planJaws(chuck({ lastGroundMm: 60 }))?.cleanUp.working.note).toMatch(/another preload/);
  });

  it('cannot be one, nor wider than the bore', () => {
    expect(planJaws(chuck({ jawCount: 1 }))).toBeNull();
    expect(planJaws(chuck({ boreMm: 0 }))).toBeNull();
    expect(planJaws(chuck({ padWidthMm: 60.001 }))).toBeNull();
    expect(planJaws(chuck({ padWidthMm: 60 }))).not.toBeNull();
    expect(planJaws(chuck({ padWidthMm: 50, lastGroundMm: 49 }))).toBeNull();
  });
});

/**
 * An independent check: pads as points in space, and a wheel of some radius moved out until, in one turn of
 * the chuck, it meets each of them. No formula of the rule is used.
 */
describe('a wheel swept round a chuck', () => {
  const WHEEL_RADIUS = 11;
  const POINTS_ACROSS = 13;

  interface Point {
    x: number;
    y: number;
    jaw: number;
  }

  function padPoints(spec: JawChuck): Point[] {
    const radius = spec.boreMm / 2;
    const lastRadius = (spec.lastGroundMm ?? spec.boreMm) / 2;
    const ends = [
      { z: spec.padBackMm, error: 'backMm' as const },
      { z: spec.padFrontMm, error: 'frontMm' as const },
    ];
    const points: Point[] = [];
    for (let jaw = 0; jaw < spec.jawCount; jaw += 1) {
      const angle = (2 * Math.PI * jaw) / spec.jawCount;
      for (const { z, error } of ends) {
        const standing = radius + (spec.padErrors[jaw]?.[error] ?? 0);
        for (let i = 0; i < POINTS_ACROSS; i += 1) {
          const across = spec.padWidthMm * (i / (POINTS_ACROSS - 1) - 0.5);
          const along = standing - lastRadius + Math.sqrt(lastRadius ** 2 - across ** 2);
          points.push({
            x:
              along * Math.cos(angle) -
              across * Math.sin(angle) +
              spec.offset.at0.aMm +
              spec.offset.perMm.aMm * z,
            y:
              along * Math.sin(angle) +
              across * Math.cos(angle) +
              spec.offset.at0.bMm +
              spec.offset.perMm.bMm * z,
            jaw,
          });
        }
      }
    }
    return points;
  }

  function meets(point: Point, wheelAtMm: number): boolean {
    const facing = Math.atan2(point.y, point.x);
    for (let step = -50; step <= 50; step += 1) {
      const turn = -facing + (step * Math.PI) / 18000;
      const x = point.x * Math.cos(turn) - point.y * Math.sin(turn);
      const y = point.x * Math.sin(turn) + point.y * Math.cos(turn);
      if ((x - wheelAtMm) ** 2 + y ** 2 <= WHEEL_RADIUS ** 2) return true;
    }
    return false;
  }

  /** Between a wheel on the axis, which meets nothing, and one whose centre is on the point. */
  function wheelPositionThatMeets(point: Point): number {
    let [clear, met] = [0, Math.hypot(point.x, point.y)];
    for (let turn = 0; turn < 26; turn += 1) {
      const middle = (clear + met) / 2;
      if (meets(point, middle)) met = middle;
      else clear = middle;
    }
    return met;
  }

  const millimetres = (min: number, max: number) => fc.double({ min, max, noNaN: true });
  const anyChuck = fc
    .record({
      jawCount: fc.integer({ min: 2, max: 6 }),
      boreMm: millimetres(40, 120),
      half: millimetres(0.05, 0.3),
      old: millimetres(0.94, 1.06),
      offset: fc.record({
        at0: fc.record({ aMm: millimetres(-0.1, 0.1), bMm: millimetres(-0.1, 0.1) }),
        perMm: fc.record({ aMm: millimetres(-0.002, 0.002), bMm: millimetres(-0.002, 0.002) }),
      }),
      padErrors: fc.array(
        fc.record({ backMm: millimetres(-0.05, 0.05), frontMm: millimetres(-0.05, 0.05) }),
        { minLength: 6, maxLength: 6 },
      ),
    })
    .map(({ half, old, ...rest }): JawChuck => ({
      ...rest,
      padWidthMm: half * rest.boreMm,
      padBackMm: 5,
      padFrontMm: 45,
      lastGroundMm: old * rest.boreMm,
    }));

  it('meets first and leaves last where the rule says', () => {
    fc.assert(
      fc.property(anyChuck, (spec) => {
        const plan = planJaws(spec);
        if (plan === null) return false;
        const met = padPoints(spec).map((point) => ({
          jaw: point.jaw,
          at: wheelPositionThatMeets(point),
        }));
        const first = Math.min(...met.map(({ at }) => at));
        // Second order of the offset, and the spacing of the points across a pad.
        const doubt = 0.004;
        return plan.contacts.every(({ jaw, touchesAtMm, cleanAtMm }) => {
          const own = met.filter((point) => point.jaw === jaw - 1).map(({ at }) => at);
          return (
            Math.abs(Math.min(...own) - first - touchesAtMm) < doubt &&
            Math.abs(Math.max(...own) - first - cleanAtMm) < doubt
          );
        });
      }),
      { numRuns: 30, endOnFailure: true },
    );
  });
});
