import { DEFAULT_SHOP_RULES } from '@/shared/domain/shop-rules';
import { OPERATIONS } from '@/shared/domain/setups';
import { CAUTIONS, findingWords, orderOfWork, planSetup } from '@/shared/rules';

import {
  boreInput,
  codes,
  found,
  GOOD_INPUTS,
  jawsInput,
  LARGE_WHEEL,
  outsideInput,
  QUILL,
  SMALL_WHEEL,
  withCut,
  withStep,
  withWork,
} from '../../support/plan-inputs';

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

  it.each(OPERATIONS)(
    'take from the wheel a twentieth of what they take from the work: %s',
    (op) => {
      const input = GOOD_INPUTS[op]();
      const { infeed, jaws } = planSetup(input);
      const wheel = input.wheelData ?? SMALL_WHEEL;
      const workMm = (jaws ? input.work.jawBoreMm : input.work.diameterMm) ?? NaN;
      const removedMm3 =
        Math.PI * workMm * (infeed.rough.value ?? NaN) * (input.work.lengthMm ?? NaN);
      const wornMm3 =
        Math.PI * wheel.diameterNowMm * (infeed.wheelWear.value ?? NaN) * wheel.widthMm;
      expect(removedMm3 / wornMm3).toBeCloseTo(20, 9);
    },
  );

  it('cut the traverse before the infeed where the quill is slender', () => {
    const stiff = planSetup(boreInput());
    const slender = planSetup({
      ...boreInput(),
      quill: { ...QUILL, segments: [{ lengthMm: 75, diameterMm: 12 }] },
      rules: { ...DEFAULT_SHOP_RULES, lagLimitMm: 0.01 },
    });
    expect(slender.traverse.rough.value).toBeLessThan(stiff.traverse.rough.value ?? NaN);
    expect(slender.infeed.rough.value).toBe(stiff.infeed.rough.value);
    expect(slender.quill.lag.value).toBeLessThanOrEqual(0.01 + 1e-9);
  });
});

describe('a weak motor', () => {
  const weak = (cut: object) => {
    const input = boreInput();
    const grinder = input.grinder && { ...input.grinder, motorPowerW: 60 };
    return planSetup(withCut({ ...input, grinder }, cut));
  };

  it('is not asked for more than its share: the infeed gives way', () => {
    const plan = weak({});
    expect(plan.infeed.governedBy).toBe('power');
    expect(plan.power.power.value).toBeLessThanOrEqual(0.8 * 60 + 1e-9);
    expect(plan.power.power.value).toBeGreaterThan(0.4 * 60);
    expect(codes(plan)).not.toContain('power-above-share');
  });

  it('is a Check where the chosen infeed asks for more', () => {
    expect(found(weak({ roughInfeedMm: 0.02 }), 'power-above-share')).toMatchObject({
      level: 'check',
      figures: { limit: { value: 48 } },
    });
  });
});

describe('a chosen infeed on a slender quill', () => {
  it('is a Check above the lag aimed at, with both figures', () => {
    const input = {
      ...boreInput(),
      quill: { ...QUILL, segments: [{ lengthMm: 90, diameterMm: 10 }] },
    };
    const lag = (roughInfeedMm: number) =>
      found(planSetup(withCut(input, { roughInfeedMm })), 'lag-above-limit');
    expect(lag(0.0025)).toBeUndefined();
    expect(lag(0.025)).toMatchObject({ level: 'check', figures: { limit: { value: 0.015 } } });
    expect(lag(0.025)?.figures.lag?.value).toBeGreaterThan(0.015);
  });
});

describe('a blind bore', () => {
  it('needs room behind, which a through bore has', () => {
    const at = (throughBore: boolean) =>
      codes(planSetup(withWork(boreInput(), { throughBore, clearDepthMm: 2 })));
    expect(at(true)).toEqual([]);
    expect(at(false)).toEqual(['no-room-behind']);
  });
});

describe('cautions', () => {
  it.each(OPERATIONS)('belong to the operation and leave the verdict alone: %s', (operation) => {
    const { cautions, verdict } = planSetup(GOOD_INPUTS[operation]());
    expect(verdict).toBe('clear');
    expect(cautions[0]).toBe('marking-first');
    expect(cautions.length).toBeGreaterThan(20);
    expect(cautions.includes('guard-outside')).toBe(['outside', 'taper'].includes(operation));
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
  it('speaks of spark-out at the end only where there is one', () => {
    const words = (sparkOutPasses: number) => {
      const input = withCut(outsideInput(), { sparkOutPasses });
      return orderOfWork(planSetup(input), input).find(({ id }) => id === 'finish')?.words;
    };
    expect(words(0)).not.toContain('without infeed');
    expect(words(2)).toContain('{sparks} without infeed');
  });

  it.each(OPERATIONS)(
    'runs from survey to the last measurement, every figure in place: %s',
    (op) => {
      const input = GOOD_INPUTS[op]();
      const steps = orderOfWork(planSetup(input), input);
      expect(steps.map(({ id }) => id)).toEqual([
        'survey',
        'holding',
        ...(op === 'taper' ? ['set-over'] : []),
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
