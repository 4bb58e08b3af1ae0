/** A Course in Wood Turning: speeds of pulleys. */
import { expectedRpm, worstRpm } from '@/shared/rules/speed';

const STEP = {
  drivingPulleyMm: 4 * 25.4,
  drivenPulleyMm: 20 * 25.4,
  beltThicknessMm: 0,
  measured: null,
};

describe('a 4 in pulley at 1 500 rpm on a 20 in one (A Course in Wood Turning; handbook)', () => {
  it('turns the driven shaft at 300 rpm', () => {
    expect(expectedRpm(1500, STEP).value).toBeCloseTo(300, 9);
    expect(worstRpm(1500, STEP).value).toBeCloseTo(300, 9);
  });
});
