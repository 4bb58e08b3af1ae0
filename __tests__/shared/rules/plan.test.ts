import { DEFAULT_SHOP_RULES } from '@/shared/domain/shop-rules';
import { OPERATIONS, type PlanInput } from '@/shared/domain/setups';
import { assemblePlanInput, emptySetupInputs, planSetup, RULES_VERSION } from '@/shared/rules';

import {
  boreInput,
  codes,
  found,
  GOOD_INPUTS,
  jawsInput,
  outsideInput,
  SMALL_WHEEL,
  TODAY,
  withStep,
  withWork,
} from '../../support/plan-inputs';

describe('a plan with good inputs', () => {
  it.each(OPERATIONS)('reads Clear without any finding: %s', (operation) => {
    const plan = planSetup(GOOD_INPUTS[operation]());
    expect(plan.findings).toEqual([]);
    expect(plan.needs).toEqual([]);
    expect(plan.verdict).toBe('clear');
    expect(plan.rulesVersion).toBe(RULES_VERSION);
  });

  it.each(OPERATIONS)('has a value for every figure: %s', (operation) => {
    const plan = planSetup(GOOD_INPUTS[operation]());
    const figures = [
      plan.speed.spindleRpm,
      plan.speed.wheelSpeed,
      plan.speed.speedRatio,
      ...Object.values(plan.work).filter(
        (value) => typeof value === 'object' && 'working' in value,
      ),
      plan.traverse.rough,
      plan.traverse.finish,
      plan.traverse.roughRate,
      plan.traverse.finishRate,
      plan.traverse.overrun,
      plan.traverse.travel,
      plan.traverse.secondsPerStroke,
      plan.infeed.rough,
      plan.infeed.finish,
      plan.stock,
      plan.cutFraction.rough,
      plan.cutFraction.finish,
      ...Object.values(plan.quill),
      ...Object.values(plan.power),
      ...Object.values(plan.time),
      plan.dressing?.rough.secondsAcross,
      plan.dressing?.finish.lead,
      plan.dressing?.diamond,
    ];
    expect(figures.length).toBeGreaterThan(30);
    for (const figure of figures) expect(figure).toMatchObject({ value: expect.any(Number) });
  });

  it('cuts a hardened shaft of 40 mm at 180 rpm with a 120 mm wheel at 24.9 m/s', () => {
    const plan = planSetup(outsideInput());
    expect(plan.speed.wheelSpeed.value).toBeCloseTo(24.87, 2);
    expect(plan.work.latheRpm.value).toBe(180);
    expect(plan.stock.value).toBeCloseTo(0.05, 9);
    expect(plan.speed.suggested).toBe('b');
  });
});

describe('an empty draft', () => {
  const empty = (operation: PlanInput['operation']) =>
    planSetup(
      assemblePlanInput(emptySetupInputs(operation), {
        lathe: null,
        grinder: null,
        quill: null,
        wheel: null,
        rules: DEFAULT_SHOP_RULES,
        today: TODAY,
      }),
    );

  it.each(OPERATIONS)('is incomplete and stops nothing: %s', (operation) => {
    const plan = empty(operation);
    expect(plan.verdict).toBe('incomplete');
    expect(plan.findings.filter(({ level }) => level === 'stop')).toEqual([]);
    expect(new Set(plan.needs.map(({ field }) => field)).size).toBe(plan.needs.length);
  });

  it('asks for the jaws in the words of the shop, and for little enough', () => {
    const { needs } = empty('jaws');
    expect(needs.length).toBeLessThanOrEqual(17);
    expect(needs).toContainEqual({
      part: 'work',
      field: 'work.nearRunOutMm',
      label: 'run-out near the chuck',
    });
    expect(needs).toContainEqual({ part: 'wheel', field: 'wheel.wheelId', label: 'wheel' });
    expect(needs.map(({ field }) => field)).toContain('machine.beltStepId');
  });

  it('keeps its one Check about open jaws out of the verdict until it is complete', () => {
    expect(codes(empty('jaws'))).toEqual(['jaws-open']);
  });
});

describe('needs', () => {
  it('leave out what may stay unanswered', () => {
    const plan = planSetup(
      withWork(boreInput(), { toleranceMm: null, shaftDiameterMm: null, clearDepthMm: null }),
    );
    expect(plan.needs).toEqual([]);
    expect(planSetup(withWork(jawsInput(), { bellMouthMm: null })).needs).toEqual([]);
  });

  it('ask how deep a blind bore is clear, and not a through one', () => {
    const blind = planSetup(withWork(boreInput(), { throughBore: false, clearDepthMm: null }));
    expect(blind.needs.map(({ field }) => field)).toEqual(['work.clearDepthMm']);
  });

  it('ask for no high spot where there is no run-out', () => {
    const plan = planSetup(withWork(jawsInput(), { nearRunOutMm: 0, nearHighSpotDeg: null }));
    expect(plan.needs).toEqual([]);
    expect(plan.jaws).not.toBeNull();
  });

  it('ask for what a typed wheel does not say yet', () => {
    const typed = {
      marking: null,
      diameterNewMm: 25,
      diameterNowMm: null,
      widthMm: 12,
      holeMm: 8,
      markedRpm: null,
      markedSpeedMPerS: null,
      markingReadOn: null,
      looked: null,
      rung: null,
    };
    const input = jawsInput();
    const plan = planSetup(
      assemblePlanInput({ ...input, wheel: { wheelId: null, typed } }, { ...input, wheel: null }),
    );
    expect(plan.verdict).toBe('incomplete');
    expect(plan.needs.map(({ field }) => field)).toEqual([
      'wheel.typed.looked',
      'wheel.typed.rung',
      'wheel.typed.markedRpm',
    ]);
    expect(plan.limits.governing).toBeNull();
    for (const mark of [{ markedRpm: 24_000 }, { markedSpeedMPerS: 35 }]) {
      const marked = { ...input, wheel: { wheelId: null, typed: { ...typed, ...mark } } };
      const { needs } = planSetup(assemblePlanInput(marked, { ...input, wheel: null }));
      expect(needs.map(({ field }) => field)).not.toContain('wheel.typed.markedRpm');
    }
    expect(plan.speed.steps.map(({ allowed }) => allowed)).toEqual([null, null, null]);
  });

  it('do not hide a Stop that is already known', () => {
    const input = withWork(jawsInput(), { material: null });
    const stopped = planSetup({ ...input, wheelData: { ...SMALL_WHEEL, state: 'scrapped' } });
    expect(stopped.needs).not.toEqual([]);
    expect(stopped.verdict).toBe('stop');
  });
});

describe('belt steps', () => {
  it('above the limit are locked out, and a chosen one is a Stop with its figures', () => {
    const slow = { ...SMALL_WHEEL, markedRpm: 15_000 };
    const plan = planSetup({ ...jawsInput(), wheelData: slow });
    expect(plan.speed.steps.map(({ name, allowed }) => [name, allowed])).toEqual([
      ['A', true],
      ['B', false],
      ['C', false],
    ]);
    expect(plan.speed.chosen).toBe('b');
    expect(plan.speed.suggested).toBe('a');
    expect(plan.verdict).toBe('stop');
    expect(found(plan, 'step-too-fast')).toMatchObject({
      figures: { rpm: { value: (2850 * 120) / 22 }, limit: { value: 15_000 } },
      names: { step: 'B', governs: 'marked rpm' },
    });
  });

  it('at the limit are allowed, and a hair above it are not', () => {
    const rpm = (2850 * 120) / 22;
    const at = (markedRpm: number) =>
      planSetup({ ...jawsInput(), wheelData: { ...SMALL_WHEEL, markedRpm } }).speed.steps[1];
    expect(at(Math.ceil(rpm))?.allowed).toBe(true);
    expect(at(Math.floor(rpm))?.allowed).toBe(false);
  });

  it('leave their figures null while none is chosen, but list every row', () => {
    const plan = planSetup(withStep(jawsInput(), null));
    expect(plan.speed.spindleRpm.value).toBeNull();
    expect(plan.speed.steps.map(({ rpm }) => Math.round(rpm.value ?? NaN))).toEqual([
      8550, 15_545, 21_375,
    ]);
    expect(plan.speed.suggested).toBe('c');
    expect(plan.needs.map(({ field }) => field)).toEqual(['machine.beltStepId']);
  });

  it('are all named when none is slow enough', () => {
    const plan = planSetup({ ...jawsInput(), wheelData: { ...SMALL_WHEEL, markedRpm: 5000 } });
    expect(codes(plan)).toContain('every-step-too-fast');
    expect(plan.speed.suggested).toBeNull();
  });
});

describe('an unmarked wheel', () => {
  it('has a limit of 0 and is a Stop', () => {
    const plan = planSetup({ ...jawsInput(), wheelData: { ...SMALL_WHEEL, markedRpm: null } });
    expect(plan.limits.governing).toMatchObject({ kind: 'unmarked', rpm: { value: 0 } });
    expect(plan.speed.steps.every(({ allowed }) => allowed === false)).toBe(true);
    expect(codes(plan).filter((code) => code !== 'jaws-open')).toEqual(['unmarked-wheel']);
    expect(plan.verdict).toBe('stop');
  });
});
