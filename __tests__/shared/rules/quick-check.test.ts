import { quickCheck, type QuickCheckInput } from '@/shared/rules';

const WHEEL: QuickCheckInput = {
  wheelDiameterMm: 150,
  marking: { speedMPerS: 35 },
  spindle: { rpm: 4400 },
};

describe('the quick check', () => {
  it('reads Clear under the limit, with the rim speed', () => {
    const answer = quickCheck(WHEEL);
    expect(answer).toMatchObject({ verdict: 'clear', needs: [] });
    expect(answer.limit.value).toBe(4456);
    expect(answer.rpm.value).toBe(4400);
    expect(answer.surfaceSpeed.value).toBeCloseTo(34.56, 2);
    expect(answer.findings.map(({ code }) => code)).toEqual(['wheel-speed-high']);
  });

  it('holds the limit itself, and stops a turn above it', () => {
    expect(quickCheck({ ...WHEEL, spindle: { rpm: 4456 } }).verdict).toBe('clear');
    const fast = quickCheck({ ...WHEEL, spindle: { rpm: 4457 } });
    expect(fast.verdict).toBe('stop');
    expect(fast.findings[0]).toMatchObject({
      code: 'spindle-too-fast',
      figures: { rpm: { value: 4457 }, limit: { value: 4456 } },
    });
  });

  it('takes a marking in rpm as it is', () => {
    const answer = quickCheck({ ...WHEEL, marking: { rpm: 4000 } });
    expect(answer.limit.value).toBe(4000);
    expect(answer.verdict).toBe('stop');
  });

  it('uses the highest rpm that pulleys can give', () => {
    const spindle = { motorRpm: 2850, drivingPulleyMm: 100, drivenPulleyMm: 63 };
    const answer = quickCheck({ ...WHEEL, spindle });
    expect(answer.rpm.value).toBeCloseTo(4523.8, 1);
    expect(answer.verdict).toBe('stop');
  });

  it('names what it still needs, and answers what it can', () => {
    const answer = quickCheck({
      wheelDiameterMm: 150,
      marking: { speedMPerS: null },
      spindle: { motorRpm: 2850, drivingPulleyMm: null, drivenPulleyMm: 63 },
    });
    expect(answer.verdict).toBe('incomplete');
    expect(answer.needs.map(({ field }) => field)).toEqual([
      'marking.speedMPerS',
      'spindle.drivingPulleyMm',
    ]);
    expect(answer.limit.value).toBeNull();
    expect(quickCheck({ ...WHEEL, wheelDiameterMm: null }).limit.value).toBeNull();
    expect(
      quickCheck({ ...WHEEL, wheelDiameterMm: null, marking: { rpm: 4000 } }).limit.value,
    ).toBe(4000);
  });

  it('stops even while something is missing: 9 000 rpm on a wheel marked 4 000', () => {
    const answer = quickCheck({
      wheelDiameterMm: null,
      marking: { rpm: 4000 },
      spindle: { rpm: 9000 },
    });
    expect(answer.verdict).toBe('stop');
  });

  it('treats nothing, negatives and non-numbers as missing', () => {
    for (const bad of [0, -5, Number.NaN, Infinity])
      expect(quickCheck({ ...WHEEL, spindle: { rpm: bad } }).verdict).toBe('incomplete');
  });
});
