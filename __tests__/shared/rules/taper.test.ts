import fc from 'fast-check';

import { DEFAULT_SHOP_RULES } from '@/shared/domain/shop-rules';
import { compoundReading, handFedWorkSpeed, slantTravel } from '@/shared/rules/compound';
import { shrinkage } from '@/shared/rules/cooling';
import { stated } from '@/shared/rules/figures';
import {
  coneDiameter,
  halfAngle,
  halfAngleOfTaper,
  halfOfIncluded,
  normalInfeed,
  tailstockCorrection,
  tailstockSetover,
  taperPerLength,
} from '@/shared/rules/taper';

const degrees = (value: number) => stated('half angle', [value, 'deg']);
const anyHalf = fc.double({ min: 0.01, max: 80, noNaN: true });

describe('the angle of a cone', () => {
  it('and its taper lead back to each other', () => {
    fc.assert(
      fc.property(anyHalf, fc.double({ min: 1, max: 500, noNaN: true }), (angle, length) => {
        const taper = taperPerLength(degrees(angle)).value ?? NaN;
        const back = halfAngle(10 + taper * length, 10, length).value ?? NaN;
        const perFoot = halfAngleOfTaper(taper).value ?? NaN;
        return Math.abs(back - angle) < 1e-9 && Math.abs(perFoot - angle) < 1e-9;
      }),
    );
  });

  it('is not there when the ends are the wrong way round, or of no length', () => {
    expect(halfAngle(20, 21, 10).value).toBeNull();
    expect(halfAngle(21, 20, 0).value).toBeNull();
    expect(halfAngle(20, 20, 10).value).toBe(0);
    expect(halfAngle(null, 20, 10).value).toBeNull();
    expect(halfAngleOfTaper(-1).value).toBeNull();
  });

  it('is half of an included angle short of a straight line', () => {
    expect(halfOfIncluded(60).value).toBe(30);
    expect(halfOfIncluded(0).value).toBeNull();
    expect(halfOfIncluded(180).value).toBeNull();
    expect(halfOfIncluded(179.9).value).toBeCloseTo(89.95, 9);
    expect(taperPerLength(degrees(90)).value).toBeNull();
  });
});

describe('the compound slide', () => {
  it('reads from its zero, and nothing while that is not known', () => {
    expect(compoundReading(degrees(30), 'cross-slide').value).toBe(60);
    expect(compoundReading(degrees(30), 'spindle-axis').value).toBe(30);
    expect(compoundReading(degrees(30), null).value).toBeNull();
  });

  it('travels the side of the cone and the overrun at both ends', () => {
    expect(slantTravel(30, degrees(Math.atan2(40, 30) * (180 / Math.PI)), 5).value).toBeCloseTo(
      60,
      9,
    );
    expect(slantTravel(30, degrees(90), 5).value).toBeNull();
  });

  it('fed one crank turn a second, lets the work turn once for each traverse', () => {
    const speed = handFedWorkSpeed(2, 0.5, 25).value ?? NaN;
    const turnsPerSecond = (speed * 1000) / 60 / (Math.PI * 25);
    expect(2 / turnsPerSecond).toBeCloseTo(0.5, 9);
    expect(handFedWorkSpeed(2, 0, 25).value).toBeNull();
  });
});

describe('moves on a cone', () => {
  it('square to its side are the two parts of one step', () => {
    fc.assert(
      fc.property(anyHalf, (angle) => {
        const across = normalInfeed(1, degrees(angle), 'cross-slide').value ?? NaN;
        const along = normalInfeed(1, degrees(angle), 'carriage').value ?? NaN;
        return Math.abs(Math.hypot(across, along) - 1) < 1e-12;
      }),
    );
    expect(normalInfeed(0.01, degrees(30), 'carriage').value).toBeCloseTo(0.005, 12);
  });

  it('meet a surface that curves less than the diameter there', () => {
    expect(coneDiameter(20, degrees(0)).value).toBe(20);
    expect(coneDiameter(20, degrees(60)).value).toBeCloseTo(40, 9);
    expect(coneDiameter(20, degrees(90)).value).toBeNull();
  });
});

describe('the tailstock', () => {
  it('set over by the correction, makes both diameters the same', () => {
    const sizes = { firstMm: 40, secondMm: 40.03, apartMm: 120 };
    const correction = tailstockCorrection(sizes, 300).value ?? NaN;
    const axisTilt = correction / 300;
    expect(sizes.secondMm - 2 * axisTilt * sizes.apartMm).toBeCloseTo(sizes.firstMm, 9);
    expect(tailstockCorrection({ ...sizes, apartMm: 0 }, 300).value).toBeNull();
  });

  it('makes the taper that its setover stands for', () => {
    const setover = tailstockSetover(300, stated('taper', [0.05, '1'])).value ?? NaN;
    expect((2 * setover) / 300).toBeCloseTo(0.05, 12);
  });
});

describe('cooling', () => {
  it('shrinks steel by about a hundredth on 50 mm and 20 degrees', () => {
    expect(shrinkage(50, 20, DEFAULT_SHOP_RULES).value).toBeCloseTo(0.0115, 9);
    expect(shrinkage(50, 0, DEFAULT_SHOP_RULES).value).toBe(0);
    expect(shrinkage(50, null, DEFAULT_SHOP_RULES).value).toBeNull();
    expect(shrinkage(50, 20, DEFAULT_SHOP_RULES).working.terms[0]?.assumed).toBe(true);
  });
});
