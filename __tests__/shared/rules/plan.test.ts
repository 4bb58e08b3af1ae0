import { OPERATIONS, type PlanInput } from '@/shared/domain/setups';
import {
  assemblePlanInput,
  CAUTIONS,
  emptySetupInputs,
  findingWords,
  orderOfWork,
  planSetup,
  RULES_VERSION,
  type FindingCode,
  type Plan,
} from '@/shared/rules';
import { DEFAULT_SHOP_RULES } from '@/shared/domain/shop-rules';

import {
  boreInput,
  GOOD_INPUTS,
  jawsInput,
  LARGE_WHEEL,
  outsideInput,
  SMALL_WHEEL,
  TODAY,
} from '../../support/plan-inputs';

const codes = (plan: Plan) => plan.findings.map(({ code }) => code);
const found = (plan: Plan, code: FindingCode) => plan.findings.find((entry) => entry.code === code);
const withWork = (input: PlanInput, work: Partial<PlanInput['work']>): PlanInput => ({
  ...input,
  work: { ...input.work, ...work },
});
const withCut = (input: PlanInput, cut: Partial<PlanInput['cut']>): PlanInput => ({
  ...input,
  cut: { ...input.cut, ...cut },
});
const withStep = (input: PlanInput, beltStepId: string | null): PlanInput => ({
  ...input,
  machine: { ...input.machine, beltStepId },
});

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

describe('infeed that is chosen', () => {
  it('above the table is a Check', () => {
    const plan = planSetup(withCut(outsideInput(), { roughInfeedMm: 0.06 }));
    expect(found(plan, 'infeed-above-table')?.level).toBe('check');
    expect(plan.infeed.governedBy).toBe('typed');
  });

  it('above the usual but within the table is a note', () => {
    const plan = planSetup(withCut(jawsInput(), { roughInfeedMm: 0.025 }));
    expect(found(plan, 'infeed-above-usual')?.level).toBe('note');
    expect(codes(plan)).not.toContain('infeed-above-table');
    expect(plan.infeed.rough.value).toBeCloseTo(0.025, 9);
  });

  it('between half divisions is rounded down, and said so', () => {
    const plan = planSetup(withCut(outsideInput(), { roughInfeedMm: 0.0064 }));
    expect(plan.infeed.rough.value).toBeCloseTo(0.005, 9);
    expect(codes(plan)).toContain('infeed-not-settable');
  });
});

describe('speeds of wheel and work', () => {
  it('far apart or close together are a note, then a Check, with the lathe rpm to go to', () => {
    const at = (latheRpm: number) => planSetup(withCut(outsideInput(), { latheRpm }));
    expect(found(at(290), 'speed-ratio-low')).toBeUndefined();
    expect(found(at(460), 'speed-ratio-low')?.level).toBe('note');
    expect(found(at(730), 'speed-ratio-low')?.level).toBe('check');
    expect(found(at(70), 'speed-ratio-high')?.level).toBe('note');
    expect(found(at(45), 'speed-ratio-high')?.level).toBe('check');
    expect(found(at(730), 'speed-ratio-low')?.figures.rpm?.value).toBeCloseTo(169.8, 1);
  });

  it('say that a slow wheel acts soft', () => {
    const plan = planSetup(withStep(jawsInput(), 'a'));
    expect(found(plan, 'wheel-speed-low')?.level).toBe('note');
    expect(plan.speed.steps[0]?.actsSoft).toBe(true);
    expect(plan.work.targetSpeed.value).toBeCloseTo(plan.speed.wheelSpeed.value ?? NaN, 9);
  });
});

describe('round work', () => {
  it('with less stock than run-out is a Check with the shortfall', () => {
    const plan = planSetup(withWork(outsideInput(), { runOutMm: 0.13 }));
    expect(found(plan, 'clean-up-short')).toMatchObject({ level: 'check' });
    expect(found(plan, 'clean-up-short')?.figures.shortfall?.value).toBeCloseTo(0.03, 9);
    expect(codes(planSetup(withWork(outsideInput(), { runOutMm: 0.1 })))).not.toContain(
      'clean-up-short',
    );
  });
});

describe('jaws', () => {
  it('take off what cleans them and one more thousandth (common practice, no source)', () => {
    const plan = planSetup(jawsInput());
    expect((plan.stock.value ?? NaN) - (plan.jaws?.cleanUp.value ?? NaN)).toBeCloseTo(0.025, 9);
  });

  it('are worn at the front: bell-mouth adds to what must come off', () => {
    const even = planSetup(jawsInput()).jaws?.cleanUp.value ?? NaN;
    const worn = planSetup(withWork(jawsInput(), { bellMouthMm: 0.05 })).jaws?.cleanUp.value ?? NaN;
    expect(worn).toBeGreaterThan(even + 0.02);
  });
});

describe('a figure typed in the other unit', () => {
  it('is asked about, and its Stop stands all the same', () => {
    const wheelData = { ...SMALL_WHEEL, diameterNewMm: 28 * 25.4, diameterNowMm: 27 * 25.4 };
    const plan = planSetup({ ...jawsInput(), wheelData });
    expect(found(plan, 'unit-doubt')).toMatchObject({
      level: 'note',
      names: { unit: 'inches', firstLabel: 'wheel diameter' },
    });
    expect(codes(plan)).toContain('wheel-fills-bore');
  });
});

describe('a surface no wider than the wheel', () => {
  const plan = planSetup(withWork(outsideInput(), { lengthMm: 14 }));

  it('is plunged: fed by the turn, without traverse', () => {
    expect(plan.traverse.plunge).toBe(true);
    expect(plan.traverse.rough.value).toBeNull();
    expect(plan.infeed.perTurn?.rough.value).toBeGreaterThan(0);
    expect(plan.infeed.perTurn?.rough.value).toBeLessThanOrEqual(0.0001 * 25.4 + 1e-12);
    expect(plan.time.total.value).toBeGreaterThan(0);
    expect(plan.verdict).toBe('clear');
  });

  it('is traversed as soon as it is wider', () => {
    expect(planSetup(withWork(outsideInput(), { lengthMm: 16.1 })).traverse.plunge).toBe(false);
  });
});

describe('force and spring', () => {
  it.each(OPERATIONS)('agree: the steady force bends the set-up by the lag: %s', (operation) => {
    const plan = planSetup(GOOD_INPUTS[operation]());
    const bent = (plan.power.normalForce.value ?? NaN) / (plan.quill.stiffnessAtWheel.value ?? NaN);
    expect(plan.quill.lag.value).toBeCloseTo(bent, 9);
  });

  it('cut the traverse before the infeed where the quill is slender', () => {
    const stiff = planSetup(boreInput());
    const slender = planSetup({
      ...boreInput(),
      quill: {
        segments: [{ lengthMm: 75, diameterMm: 12 }],
        material: 'steel',
        markedMaximumRpm: null,
        seatDiameterMm: 8,
        threadHand: 'right',
        measuredStiffnessNPerMm: null,
        measuredFrequencyHz: null,
      },
      rules: { ...DEFAULT_SHOP_RULES, lagLimitMm: 0.01 },
    });
    expect(slender.traverse.rough.value).toBeLessThan(stiff.traverse.rough.value ?? NaN);
    expect(slender.infeed.rough.value).toBe(stiff.infeed.rough.value);
    expect(slender.quill.lag.value).toBeLessThanOrEqual(0.01 + 1e-9);
  });
});

describe('cautions', () => {
  it.each(OPERATIONS)('belong to the operation and leave the verdict alone: %s', (operation) => {
    const { cautions, verdict } = planSetup(GOOD_INPUTS[operation]());
    expect(verdict).toBe('clear');
    expect(cautions[0]).toBe('marking-first');
    expect(cautions.length).toBeGreaterThan(20);
    expect(cautions.includes('guard-outside')).toBe(operation === 'outside');
    expect(cautions.includes('jaws-fixed')).toBe(operation === 'jaws');
    expect(cautions).not.toContain('mounted-overhang');
  });

  it('promise nothing', () => {
    for (const { words } of Object.values(CAUTIONS))
      expect(words).not.toMatch(/\b(safe|guaranteed|optimal)/i);
  });
});

describe('words of findings', () => {
  it('carry the figures of the plan', () => {
    const plan = planSetup({ ...outsideInput(), wheelData: { ...LARGE_WHEEL, looked: 'damaged' } });
    const damaged = found(plan, 'wheel-damaged');
    expect(damaged && findingWords(damaged, String).title).toBe(
      'Looked at closely, this wheel is damaged.',
    );
    const fast = planSetup(withStep(outsideInput(), 'c')).findings[0];
    expect(fast && findingWords(fast, ({ value, unit }) => `${value} ${unit}`).title).toBe(
      'Belt step 3 turns the wheel at 5700 rpm, above the limit of 5347 rpm (marked speed).',
    );
  });
});

describe('the order of the work', () => {
  it.each(OPERATIONS)(
    'runs from survey to the last measurement, every figure in place: %s',
    (op) => {
      const input = GOOD_INPUTS[op]();
      const steps = orderOfWork(planSetup(input), input);
      expect(steps.map(({ id }) => id)).toEqual([
        'survey',
        'holding',
        'wheel',
        'clearance',
        'trial-run',
        'dress',
        'touch-off',
        'rough',
        'spark-out',
        'measure',
        'finish-dress',
        'touch-off-again',
        'finish',
        'measure-finish',
      ]);
      for (const { words, figures } of steps)
        for (const [, key = ''] of words.matchAll(/\{(\w+)\}/g))
          expect(figures).toHaveProperty(key);
    },
  );
});
