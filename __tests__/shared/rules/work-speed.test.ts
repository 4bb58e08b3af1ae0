import { nearestStep, planWorkSpeed, targetWorkSpeed } from '@/shared/rules/work-speed';

import { LATHE } from '../../support/plan-inputs';

describe('the work speed aimed at', () => {
  it('is the table’s, but never more m/min than the wheel makes m/s', () => {
    expect(targetWorkSpeed('tool-hardened', 25).value).toBeCloseTo(15.24, 9);
    expect(targetWorkSpeed('tool-hardened', 12).value).toBe(12);
    expect(targetWorkSpeed('tool-hardened', null).value).toBeCloseTo(15.24, 9);
    expect(targetWorkSpeed(null, 25).value).toBeNull();
  });

  it('keeps the wheel at least sixty times as fast', () => {
    for (const wheel of [4, 12, 20, 33]) {
      const work = targetWorkSpeed('aluminium-alloy', wheel).value ?? NaN;
      expect((60 * wheel) / work).toBeGreaterThanOrEqual(60 - 1e-9);
    }
  });
});

describe('the nearest lathe step', () => {
  it('is judged by ratio, not by difference', () => {
    expect(nearestStep([45, 90, 180], 120)).toBe(90);
    expect(nearestStep([45, 90, 180], 128)).toBe(180);
    expect(nearestStep([100, 400], 199)).toBe(100);
    expect(nearestStep([100, 400], 201)).toBe(400);
  });

  it('does not exist without steps or a target', () => {
    expect(nearestStep([], 100)).toBeNull();
    expect(nearestStep([100], null)).toBeNull();
    expect(nearestStep([100], 0)).toBeNull();
  });
});

describe('a planned work speed', () => {
  const plan = (typedRpm: number | null) =>
    planWorkSpeed({
      material: 'tool-hardened',
      diameterMm: 40,
      wheelMPerS: 20,
      lathe: LATHE,
      typedRpm,
    });

  it('takes the nearest step, and lists every step with its ratio', () => {
    expect(plan(null).latheRpm.value).toBe(115);
    expect(plan(null).steps).toHaveLength(LATHE.spindleSpeedsRpm.length);
    for (const { workSpeedMPerMin, speedRatio } of plan(null).steps)
      expect((speedRatio ?? NaN) * workSpeedMPerMin).toBeCloseTo(1200, 6);
  });

  it('takes the speed that was chosen', () => {
    expect(plan(180).latheRpm.value).toBe(180);
    expect(plan(180).workSpeed.value).toBeCloseTo(22.62, 2);
  });
});
