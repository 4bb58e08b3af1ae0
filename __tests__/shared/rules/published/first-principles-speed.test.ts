/** From first principles, checked numerically: a small wheel on a fast spindle. */
import { quickCheck } from '@/shared/rules';

describe('a 65 mm wheel marked 4 300 m/min on a 23 000 rpm spindle (derived)', () => {
  const answer = quickCheck({
    wheelDiameterMm: 65,
    marking: { speedMPerS: 4300 / 60 },
    spindle: { rpm: 23_000 },
  });

  it('is a Stop at a limit of 21 057 rpm', () => {
    expect(answer.verdict).toBe('stop');
    expect(answer.limit.value).toBe(21_057);
  });

  it('would travel 4 697 m/min', () => {
    expect(Math.round((answer.surfaceSpeed.value ?? NaN) * 60)).toBe(4697);
  });
});
