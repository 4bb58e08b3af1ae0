import fc from 'fast-check';

import { DEFAULT_SHOP_RULES } from '@/shared/domain/shop-rules';
import type { DressInputs } from '@/shared/domain/setups';
import {
  dressCusp,
  dressLead,
  dressTraverse,
  dressWidth,
  planDressing,
  secondsAcross,
} from '@/shared/rules/dressing';
import { stated } from '@/shared/rules/figures';

const untouched: DressInputs = {
  tipRadiusMm: null,
  diamondCarats: null,
  roughDepthMm: null,
  roughPasses: null,
  roughOverlap: null,
  finishDepthMm: null,
  finishPasses: null,
  finishOverlap: null,
};

const plan = (dress: Partial<DressInputs> = {}) =>
  planDressing({
    dress: { ...untouched, ...dress },
    rules: DEFAULT_SHOP_RULES,
    diameterMm: 25,
    widthMm: 12,
    spindle: stated('spindle speed', [15_000, 'rpm']),
    marking: null,
    dry: true,
    wheelMPerS: 20,
  });

const codes = (dress: Partial<DressInputs>) => plan(dress).findings.map(({ code }) => code);

describe('the groove of the diamond', () => {
  it('is the chord of the tip at that depth', () => {
    const radius = fc.double({ min: 0.05, max: 2, noNaN: true });
    fc.assert(
      fc.property(radius, fc.double({ min: 0.001, max: 1, noNaN: true }), (tip, share) => {
        const depth = share * tip;
        const half = (dressWidth(tip, depth, false).value ?? NaN) / 2;
        return Math.abs(Math.hypot(half, tip - depth) - tip) < 1e-9;
      }),
    );
  });

  it('is not known deeper than the tip is round', () => {
    expect(dressWidth(0.1, 0.1, false).value).toBeCloseTo(0.2, 12);
    expect(dressWidth(0.1, 0.1001, false).value).toBeNull();
  });

  it('marks a radius that nobody gave', () => {
    expect(dressWidth(0.38, 0.02, true).working.terms[0]?.assumed).toBe(true);
    expect(dressWidth(0.38, 0.02, false).working.terms[0]?.assumed).toBeUndefined();
  });

  it('leaves a thread of about the height between two arcs a lead apart', () => {
    const tip = 0.4;
    const depth = 0.02;
    const lead = dressLead(dressWidth(tip, depth, false), 4).value ?? NaN;
    const exact = tip - Math.sqrt(tip ** 2 - (lead / 2) ** 2);
    expect(dressCusp(depth, 4).value).toBeCloseTo(exact, 4);
  });

  it('crosses no wheel that stands still, and none at no overlap', () => {
    const width = dressWidth(0.38, 0.02, false);
    const still = dressTraverse(dressLead(width, 3), stated('n', [0, 'rpm']));
    expect(secondsAcross(12, still).value).toBeNull();
    expect(dressLead(width, 0).value).toBeNull();
    expect(dressCusp(0.02, 0).value).toBeNull();
  });
});

describe('dressing a wheel', () => {
  it('opens it for roughing and closes it for finishing', () => {
    const { rough, finish, findings } = plan();
    expect(findings).toEqual([]);
    expect(rough.overlap).toBe(DEFAULT_SHOP_RULES.roughDressOverlap);
    expect(finish.overlap).toBe(DEFAULT_SHOP_RULES.finishDressOverlap);
    expect(rough.traverseRate.value).toBeGreaterThan(finish.traverseRate.value ?? Infinity);
    expect(rough.secondsAcross.value).toBeLessThan(finish.secondsAcross.value ?? 0);
  });

  it('takes twice the depth off the diameter with each pass', () => {
    expect(plan({ roughDepthMm: 0.02, roughPasses: 4 }).rough.wheelLoss.value).toBeCloseTo(
      0.16,
      12,
    );
  });

  it('takes the time of the wheel and a millimetre beside it at both ends', () => {
    const { rough } = plan();
    const seconds = (60 * 14) / (rough.traverseRate.value ?? NaN);
    expect(rough.secondsAcross.value).toBeCloseTo(seconds, 12);
  });

  it('goes no deeper than a thousandth of an inch without a check', () => {
    expect(codes({ roughDepthMm: 0.0254 })).toEqual([]);
    expect(codes({ roughDepthMm: 0.0255 })).toEqual(['dress-too-deep']);
    expect(codes({ finishDepthMm: 0.05, roughDepthMm: 0.05 })).toEqual([
      'dress-too-deep',
      'dress-too-deep',
    ]);
  });

  it('notes an overlap under two', () => {
    expect(codes({ roughOverlap: 2 })).toEqual([]);
    expect(codes({ roughOverlap: 1.9 })).toEqual(['dress-overlap-low']);
  });

  it('checks a diamond that is smaller than the table asks', () => {
    expect(plan().diamond.value).toBe(0.35);
    expect(codes({ diamondCarats: 0.35 })).toEqual([]);
    expect(codes({ diamondCarats: 0.3 })).toEqual(['diamond-small']);
  });

  it('is not known without a wheel, and finds nothing then', () => {
    const empty = planDressing({
      dress: untouched,
      rules: DEFAULT_SHOP_RULES,
      diameterMm: null,
      widthMm: null,
      spindle: stated('spindle speed', [null, 'rpm']),
      marking: null,
      dry: true,
      wheelMPerS: null,
    });
    expect(empty.rough.secondsAcross.value).toBeNull();
    expect(empty.diamond.value).toBeNull();
    expect(empty.findings).toEqual([]);
  });
});
