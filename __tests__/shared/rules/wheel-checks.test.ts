import type { WheelData } from '@/shared/domain/wheels';
import { wheelFindings } from '@/shared/rules/wheel-checks';

import { LARGE_WHEEL, QUILL, SMALL_WHEEL, TODAY } from '../../support/plan-inputs';

const check = (
  over: Partial<WheelData>,
  use: { organicBond?: boolean | null; typed?: boolean; seatMm?: number } = {},
) =>
  wheelFindings({
    wheel: { ...SMALL_WHEEL, ...over },
    quill: { ...QUILL, seatDiameterMm: use.seatMm ?? QUILL.seatDiameterMm },
    organicBond: use.organicBond ?? false,
    typed: use.typed ?? false,
    today: TODAY,
  }).map(({ code, level }) => `${level} ${code}`);

const mandrel = { mandrelDiameterMm: 6, overhangMm: 13, threaded: false, makerMaximumRpm: 30_000 };

describe('a sound wheel in date on a seat that fits', () => {
  it('has no finding', () => {
    expect(check({})).toEqual([]);
  });
});

describe('a wheel that must not run', () => {
  it.each<[string, Partial<WheelData>]>([
    ['wheel-set-aside', { state: 'set aside', setAsideReason: 'dropped' }],
    ['wheel-scrapped', { state: 'scrapped' }],
    ['wheel-damaged', { looked: 'damaged' }],
    ['wheel-not-looked-at', { looked: null }],
    ['ring-dull', { rung: 'dull' }],
    ['ring-missing', { rung: null }],
    ['wheel-grown', { diameterNowMm: 28.01 }],
    ['unmarked-wheel', { markedRpm: null }],
  ])('stops as %s', (code, over) => {
    expect(check(over)).toEqual([`stop ${code}`]);
  });
});

describe('a date of expiry', () => {
  it('holds to the end of its day', () => {
    expect(check({ expiresOn: '2026-03-02' })).toEqual([]);
    expect(check({ expiresOn: '2026-03-01' })).toEqual(['stop wheel-expired']);
    expect(check({ expiresOn: '2026-10-01' })).toEqual([]);
  });
});

describe('a wheel that does not ring', () => {
  it('is left to the look up to 4 in (MIOSHA R 408.10113)', () => {
    const at = (mm: number) =>
      check(
        { ...LARGE_WHEEL, diameterNewMm: 125, diameterNowMm: mm, rung: 'silent' },
        { seatMm: 20 },
      );
    expect(at(101.6)).toEqual(['note ring-silent']);
    expect(at(101.7)).toEqual(['stop ring-silent-large']);
  });

  it('is left to the look when its bond is organic', () => {
    expect(check({ ...LARGE_WHEEL, rung: 'silent' }, { seatMm: 20, organicBond: true })).toEqual([
      'note ring-silent',
    ]);
  });

  it('cannot be rung on a mandrel', () => {
    expect(check({ rung: null, mounted: mandrel }, { seatMm: 6 })).toEqual([]);
  });
});

describe('a wheel that is being typed in', () => {
  it('is asked about instead of stopped', () => {
    expect(check({ looked: null, rung: null, markedRpm: null }, { typed: true })).toEqual([]);
    expect(check({ looked: 'damaged', rung: 'dull' }, { typed: true })).toEqual([
      'stop wheel-damaged',
      'stop ring-dull',
    ]);
  });
});

describe('marked rpm and m/s', () => {
  it('may differ by rounding, and disagree beyond it', () => {
    expect(check({ markedRpm: 23_800, markedSpeedMPerS: 35 })).toEqual([]);
    expect(check({ markedRpm: 22_000, markedSpeedMPerS: 35 })).toEqual(['note markings-disagree']);
  });
});

describe('the hole', () => {
  it('goes on its seat freely, is never forced, and is not loose', () => {
    expect(check({ holeMm: 8 })).toEqual([]);
    expect(check({ holeMm: 7.99 })).toEqual(['stop hole-too-small']);
    expect(check({ holeMm: 8.25 })).toEqual([]);
    expect(check({ holeMm: 8.26 })).toEqual(['stop hole-too-large']);
  });

  it('does not take 1/2 in for 12 mm', () => {
    expect(check({ holeMm: 12.7 }, { seatMm: 12 })).toEqual(['stop hole-too-large']);
    expect(check({ holeMm: 12 }, { seatMm: 12.7 })).toEqual(['stop hole-too-small']);
  });

  it('gives way to the mandrel of a mounted wheel', () => {
    const at = (mm: number) =>
      check({ mounted: { ...mandrel, mandrelDiameterMm: mm } }, { seatMm: 6 });
    expect(at(6)).toEqual([]);
    expect(at(6.35)).toEqual(['stop mandrel-too-thick']);
    expect(at(5)).toEqual(['stop mandrel-too-thin']);
  });

  it("asks for the maker's figure of a mounted wheel", () => {
    expect(check({ mounted: { ...mandrel, makerMaximumRpm: null } }, { seatMm: 6 })).toEqual([
      'stop mounted-no-figure',
    ]);
  });
});
