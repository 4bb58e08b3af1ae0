import { runsOn } from '@/features/wheels/runs-on';
import { governingLimit, standingOf } from '@/features/wheels/standing';
import type { Grinder } from '@/shared/contracts/machines';
import { DEFAULT_SHOP_RULES } from '@/shared/domain/shop-rules';
import type { WheelData } from '@/shared/domain/wheels';
import { limitRpm } from '@/shared/rules/limits';

const TODAY = '2026-03-02';

const sound: WheelData = {
  marking: 'A 60 K 7 V',
  diameterNewMm: 32,
  diameterNowMm: 30.6,
  widthMm: 16,
  holeMm: 10,
  markedRpm: null,
  markedSpeedMPerS: 25,
  markingReadOn: 'box',
  mounted: null,
  smallestUsableMm: null,
  looked: 'sound',
  rung: 'clear',
  expiresOn: null,
  state: 'on the rack',
  setAsideReason: null,
  unsigned: false,
};

it('says where a usable wheel is', () => {
  expect(standingOf(sound, TODAY)).toEqual({ usable: true, words: 'on the rack' });
  expect(standingOf({ ...sound, state: 'mounted' }, TODAY).words).toBe('mounted');
});

it.each<[Partial<WheelData>, string]>([
  [{ state: 'set aside', setAsideReason: 'chipped rim' }, 'set aside: chipped rim'],
  [{ state: 'scrapped' }, 'scrapped'],
  [{ expiresOn: '2026-03-01' }, 'expired 1 Mar 2026'],
  [{ looked: 'damaged' }, 'damaged'],
  [{ looked: null }, 'close look due'],
  [{ rung: null }, 'ring test due'],
  [{ rung: 'dull' }, 'dull ring'],
  [{ markedSpeedMPerS: null }, 'no speed marked'],
])('%j must not run: %s', (change, words) => {
  expect(standingOf({ ...sound, ...change }, TODAY)).toEqual({ usable: false, words });
});

it('lets a wheel run on the last day before it expires', () => {
  expect(standingOf({ ...sound, expiresOn: TODAY }, TODAY).usable).toBe(true);
});

it('takes the lowest of what is marked, with the diameter when new, rounded down', () => {
  const rpm = (wheel: WheelData) => {
    const limit = governingLimit(wheel);
    return limit && limitRpm(limit);
  };
  // 60 000 x 25 / (pi x 32) = 14 920.8 (29 CFR 1910.215(d)(1); Cal. Title 8 s. 3580).
  expect(rpm(sound)).toBe(14_920);
  expect(rpm({ ...sound, diameterNowMm: 20 })).toBe(14_920);
  expect(rpm({ ...sound, markedRpm: 12_000 })).toBe(12_000);
  expect(rpm({ ...sound, markedSpeedMPerS: null })).toBe(0);
});

describe('where it may run', () => {
  const step = (name: string, drivingPulleyMm: number) => ({
    id: `step-${name}`,
    name,
    drivingPulleyMm,
    drivenPulleyMm: 30,
    beltThicknessMm: 0,
    measured: null,
  });
  const grinder: Grinder = {
    id: 'g',
    version: 1,
    createdAt: '',
    updatedAt: '',
    name: 'Post grinder B',
    typed: {},
    data: {
      motorNoLoadRpm: 3000,
      motorPowerW: 400,
      spindleMaximumRpm: 13_000,
      beltSteps: [step('A', 60), step('B', 120), step('C', 140)],
      guard: 'fixed',
      postStiffnessNPerMm: null,
      wheelRotation: null,
      shimsMm: [],
    },
    quills: [
      {
        id: 'q',
        name: 'Quill 18 × 85',
        data: {
          segments: [{ lengthMm: 85, diameterMm: 18 }],
          material: 'steel',
          markedMaximumRpm: null,
          seatDiameterMm: 10,
          threadHand: 'right',
          measuredStiffnessNPerMm: null,
          measuredFrequencyHz: null,
        },
      },
    ],
  };
  const use = (wheel: WheelData) =>
    runsOn(grinder, { wheel, today: TODAY, rules: DEFAULT_SHOP_RULES });

  it("locks a step above the wheel's or the spindle's limit", () => {
    // 3000 x 60/30, 120/30 and 140/30: 6 000, 12 000 and 14 000 rpm against 13 000.
    expect(use(sound)[0]).toBe('belt steps A, B; not C (14\u00a0000\u00a0rpm)');
    expect(use({ ...sound, markedRpm: 7000 })[0]).toContain('belt steps A; not B');
    expect(use({ ...sound, markedRpm: 500 })[0]).toBe('too fast on every belt step');
    expect(use(sound)[1]).toBe('on Quill 18 × 85');
  });

  it('says when no quill takes the hole', () => {
    expect(use({ ...sound, holeMm: 12.7 })).toEqual(['no quill or arbor here that it fits']);
  });
});
