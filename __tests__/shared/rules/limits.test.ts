import { DEFAULT_SHOP_RULES } from '@/shared/domain/shop-rules';
import { limitRpm, rpmOfMarkedSpeed, speedLimits, wheelLimits } from '@/shared/rules/limits';

import { BORE_GRINDER, QUILL, SMALL_WHEEL } from '../../support/plan-inputs';

const MARKED = { markedRpm: 22_000, markedSpeedMPerS: 35, diameterNewMm: 28, mounted: null };
const mandrel = { mandrelDiameterMm: 6, overhangMm: 12.7, threaded: false };
const all = (parts: Partial<Parameters<typeof speedLimits>[0]>) =>
  speedLimits({
    wheel: SMALL_WHEEL,
    quill: QUILL,
    grinder: BORE_GRINDER,
    rules: DEFAULT_SHOP_RULES,
    ...parts,
  }).map((limit) => [limit.kind, limitRpm(limit)]);

describe('limits of the wheel', () => {
  it('are both markings, whichever is given', () => {
    expect(wheelLimits(MARKED).map((limit) => [limit.kind, limitRpm(limit)])).toEqual([
      ['marked rpm', 22_000],
      ['marked speed', 23_873],
    ]);
  });

  it('round down, never up', () => {
    expect(rpmOfMarkedSpeed(25, 32).value).toBe(14_920);
    expect(
      wheelLimits({ ...MARKED, markedRpm: 8999.9, markedSpeedMPerS: null })[0]?.rpm.value,
    ).toBe(8999);
  });

  it('use the diameter when new, however worn the wheel', () => {
    const worn = { ...SMALL_WHEEL, diameterNowMm: 20, markedRpm: null, markedSpeedMPerS: 35 };
    expect(all({ wheel: worn })[0]).toEqual(['marked speed', 23_873]);
  });

  it('come down to nothing without a marking', () => {
    expect(
      wheelLimits({ ...MARKED, markedRpm: null, markedSpeedMPerS: null }).map(limitRpm),
    ).toEqual([0]);
  });

  it("are the maker's figure for a mounted wheel, and 0 without one", () => {
    const bare = { ...MARKED, markedRpm: null, markedSpeedMPerS: null };
    const at = (makerMaximumRpm: number | null) =>
      wheelLimits({ ...bare, mounted: { ...mandrel, makerMaximumRpm } }).map((limit) => [
        limit.kind,
        limitRpm(limit),
      ]);
    expect(at(30_500)).toEqual([['maker, mounted', 30_500]]);
    expect(at(null)).toEqual([['maker, mounted', 0]]);
  });

  it('say which figure a threaded mandrel takes', () => {
    const threaded = { ...mandrel, threaded: true, makerMaximumRpm: 30_000 };
    expect(wheelLimits({ ...MARKED, mounted: threaded }).at(-1)?.rpm.working.note).toMatch(
      /half an inch/,
    );
  });
});

describe('limits in force', () => {
  it('stand lowest first', () => {
    const rpms = all({}).map(([, rpm]) => Number(rpm));
    expect(rpms).toEqual([...rpms].sort((a, b) => a - b));
    expect(all({}).map(([kind]) => kind)).toEqual([
      'marked rpm',
      'quill marked',
      'grinder spindle',
      'quill bending',
    ]);
  });

  it('take half of a computed bending frequency and three quarters of a measured one', () => {
    const measured = { ...QUILL, measuredFrequencyHz: 400, markedMaximumRpm: null };
    expect(all({ quill: measured })).toContainEqual(['quill bending', 18_000]);
    const bending = (share: number) =>
      Number(
        all({ rules: { ...DEFAULT_SHOP_RULES, computedFrequencyShare: share } }).find(
          ([kind]) => kind === 'quill bending',
        )?.[1],
      );
    expect(bending(0.25)).toBeCloseTo(bending(0.5) / 2, -1);
  });

  it('let a slender quill govern', () => {
    const slender = {
      ...QUILL,
      markedMaximumRpm: null,
      segments: [{ lengthMm: 140, diameterMm: 9 }],
    };
    expect(all({ quill: slender })[0]?.[0]).toBe('quill bending');
  });

  it('leave out what is not known', () => {
    expect(all({ wheel: null, quill: null, grinder: null })).toEqual([]);
    expect(all({ wheel: null }).map(([kind]) => kind)).toEqual(['quill marked', 'grinder spindle']);
  });
});
