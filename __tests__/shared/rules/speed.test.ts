import {
  expectedRpm,
  rpmForSurfaceSpeed,
  stepSpeeds,
  wheelSpeed,
  worstRpm,
} from '@/shared/rules/speed';

import { BORE_GRINDER } from '../../support/plan-inputs';

const measured = (rpm: number) => ({ rpm, measuredOn: '2026-01-05', instrument: 'tachometer' });
const step = (over: object) => ({
  drivingPulleyMm: 120,
  drivenPulleyMm: 30,
  beltThicknessMm: 2,
  measured: null,
  ...over,
});

describe('wheelSpeed', () => {
  it('is pi metres a second for a metre a turn a second', () => {
    expect(wheelSpeed(1000, 60).value).toBeCloseTo(Math.PI, 12);
  });

  it('is unknown while diameter or rpm is, and not a number never', () => {
    expect(wheelSpeed(null, 60).value).toBeNull();
    expect(wheelSpeed(100, null).value).toBeNull();
    expect(wheelSpeed(Number.NaN, 60).value).toBeNull();
    expect(wheelSpeed(Infinity, 60).value).toBeNull();
  });

  it('shows the values it was worked out from', () => {
    const { terms, source } = wheelSpeed(125, 5000).working;
    expect(terms.map(({ value }) => value)).toEqual([125, 5000]);
    expect(source).toBe('groover-24');
  });
});

describe('rpmForSurfaceSpeed', () => {
  it('undoes the surface speed', () => {
    const rpm = rpmForSurfaceSpeed(60, 127) ?? NaN;
    expect((wheelSpeed(127, rpm).value ?? NaN) * 60).toBeCloseTo(60, 9);
  });

  it('is unknown without a diameter', () => {
    expect(rpmForSurfaceSpeed(20, 0)).toBeNull();
    expect(rpmForSurfaceSpeed(null, 40)).toBeNull();
  });
});

describe('the rpm to expect', () => {
  it('counts the thickness of the belt on both pulleys', () => {
    expect(expectedRpm(2800, step({})).value).toBeCloseTo(10_675, 9);
  });

  it('is the measured one where there is one, with instrument and date', () => {
    const figure = expectedRpm(2800, step({ measured: measured(10_400) }));
    expect(figure.value).toBe(10_400);
    expect(figure.working.note).toBe('tachometer, 2026-01-05.');
  });
});

describe('the worst rpm', () => {
  it('leaves the belt out where the motor pulley is the larger: thickness only slows', () => {
    expect(worstRpm(2800, step({})).value).toBeCloseTo(11_200, 9);
  });

  it('counts the belt where the spindle pulley is the larger: thickness speeds up', () => {
    const slow = step({ drivingPulleyMm: 30, drivenPulleyMm: 120 });
    expect(worstRpm(2800, slow).value).toBeCloseTo((2800 * 32) / 122, 9);
  });

  it('is the measured rpm only where that is higher', () => {
    expect(worstRpm(2800, step({ measured: measured(11_201) })).value).toBe(11_201);
    expect(worstRpm(2800, step({ measured: measured(11_199) })).value).toBeCloseTo(11_200, 9);
  });

  it('is never under the expected one', () => {
    for (const { rpm, expectedRpm: likely } of stepSpeeds(BORE_GRINDER))
      expect(rpm.value).toBeGreaterThanOrEqual(likely.value ?? NaN);
  });
});
