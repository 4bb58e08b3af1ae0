import { evaluate } from 'mathjs';

import { stated } from '@/shared/rules/figures';
import { planPasses, type ScheduleSpec } from '@/shared/rules/schedule';
import {
  cutFraction,
  fractionOverTurns,
  sparkOutPasses,
  steadyLag,
  takePass,
} from '@/shared/rules/spring';
import { postStiffness, stiffnessAtWheel, workStiffness } from '@/shared/rules/stiffness';
import { surfaceOf } from '@/shared/rules/surface';

import { boreInput, outsideInput } from '../../support/plan-inputs';

const N = (value: number) => stated('stiffness', [value, 'N/mm']);
const CUT = { energy: 38, workMPerS: 0.25, wheelMPerS: 20, traverseMm: 1.5, forceRatio: 0.4 };

describe('the cut fraction', () => {
  it('comes near one on a stiff set-up and near nothing on a soft one', () => {
    expect(cutFraction(N(1e9), CUT).value).toBeCloseTo(1, 5);
    expect(cutFraction(N(1), CUT).value).toBeLessThan(0.001);
  });

  it('falls as the traverse grows', () => {
    const slow = cutFraction(N(2000), { ...CUT, traverseMm: 0.5 }).value ?? NaN;
    expect(cutFraction(N(2000), CUT).value).toBeLessThan(slow);
  });

  it('is unknown while a part of it is', () => {
    expect(cutFraction(N(2000), { ...CUT, energy: null }).value).toBeNull();
  });

  it('grows over turns at one setting, each taking its share of what is left', () => {
    const one = stated('cut fraction', [0.4, '1']);
    let left = 1;
    for (let turn = 0; turn < 5; turn += 1) left -= 0.4 * left;
    expect(fractionOverTurns(one, 5).value).toBeCloseTo(1 - left, 12);
  });
});

describe('the steady state', () => {
  it('cuts the whole infeed at each pass and keeps its lag', () => {
    let springMm = 0;
    let cutMm = 0;
    for (let pass = 0; pass < 200; pass += 1) ({ springMm, cutMm } = takePass(0.01, springMm, 0.3));
    expect(cutMm).toBeCloseTo(0.01, 12);
    expect(springMm).toBeCloseTo(steadyLag(0.01, 0.3), 12);
  });
});

describe('spark-out', () => {
  it('is not needed where nothing springs', () => {
    expect(sparkOutPasses(0.0005, 0.0005, 0.5)).toBe(0);
    expect(sparkOutPasses(0.02, 0.0005, 1)).toBe(0);
  });

  it('leaves no more than asked, and one pass fewer would', () => {
    for (const fraction of [0.3, 0.5, 0.65, 0.8]) {
      const passes = sparkOutPasses(0.01, 0.0005, fraction);
      let spring = 0.01;
      for (let pass = 0; pass < passes; pass += 1)
        ({ springMm: spring } = takePass(0, spring, fraction));
      if (passes < 12) expect(spring).toBeLessThanOrEqual(0.0005 + 1e-12);
      expect(spring / (1 - fraction)).toBeGreaterThan(0.0005);
    }
  });

  it('stops at twelve: under a rubbing threshold some spring stays', () => {
    expect(sparkOutPasses(0.02, 0.0005, 0.05)).toBe(12);
  });
});

describe('a schedule', () => {
  const spec: ScheduleSpec = {
    stockMm: 0.1,
    finishStockMm: 0.02,
    rough: { infeedMm: 0.0125, stepMm: 0.0025, divisionMm: 0.005, cutFraction: 0.7 },
    finish: { infeedMm: 0.005, stepMm: 0.0025, divisionMm: 0.005, cutFraction: 0.8 },
    springLeftMm: 0.0005,
    sparkOuts: null,
  };

  it('roughs, sparks out two or three times, finishes, and sparks out', () => {
    const { passes, counts } = planPasses(spec);
    expect([...new Set(passes.map(({ stage }) => stage))]).toEqual([
      'rough',
      'rough spark-out',
      'finish',
      'finish spark-out',
    ]);
    expect(counts.rough).toBe(7);
    expect(counts['rough spark-out']).toBe(2);
    const soft = { ...spec, rough: { ...spec.rough, cutFraction: 0.3 } };
    expect(planPasses(soft).counts['rough spark-out']).toBe(3);
    expect(counts.finish).toBe(4);
    expect(passes.map(({ number }) => number)).toEqual(passes.map((_, index) => index + 1));
  });

  it('ends with the dial at nothing and the metal at what still springs', () => {
    const { passes } = planPasses(spec);
    const last = passes.at(-1);
    expect(last?.dialToGoMm).toBeCloseTo(0, 12);
    expect(last?.metalToGoMm).toBeCloseTo(last?.springMm ?? NaN, 12);
    expect(last?.springMm).toBeLessThanOrEqual(0.0005);
  });

  it('takes the remainder in a smaller last pass', () => {
    const { passes } = planPasses({ ...spec, stockMm: 0.0925 });
    const rough = passes.filter(({ stage }) => stage === 'rough');
    expect(rough.at(-1)?.infeedMm).toBeCloseTo(0.0725 - 5 * 0.0125, 9);
    expect(rough.at(-1)?.divisions).toBeCloseTo(2, 9);
  });

  it('finishes alone where there is no more than the finish stock', () => {
    expect(planPasses({ ...spec, stockMm: 0.02 }).counts).toMatchObject({
      rough: 0,
      'rough spark-out': 0,
      finish: 4,
    });
  });

  it('takes the spark-outs that were chosen', () => {
    expect(planPasses({ ...spec, sparkOuts: 0 }).counts['finish spark-out']).toBe(0);
    expect(planPasses({ ...spec, sparkOuts: 7 }).counts['finish spark-out']).toBe(7);
  });

  it('lists nothing beyond four hundred passes, but counts them', () => {
    const schedule = planPasses({ ...spec, stockMm: 6 });
    expect(schedule.passes).toEqual([]);
    expect(schedule.counts.rough).toBe(479);
  });
});

describe('stiffness at the wheel', () => {
  it('is below the softest part, and half of two equal ones', () => {
    const at = (quill: number, post: number) =>
      stiffnessAtWheel({ quill: N(quill), post: N(post), work: 'stiff' }).value;
    expect(at(4000, 4000)).toBeCloseTo(2000, 9);
    expect(at(1000, 1e9)).toBeCloseTo(1000, 0);
    expect(at(1000, 5000)).toBeLessThan(1000);
  });

  it('takes the post as measured, or as the shop assumes it and says so', () => {
    expect(postStiffness(7000, 5000).value).toBe(7000);
    const assumed = postStiffness(null, 5000);
    expect(assumed.value).toBe(5000);
    expect(assumed.working.terms[0]?.assumed).toBe(true);
    expect(assumed.working.source).toBe('memory-post-stiffness');
  });

  it('counts bores and jaws as stiff', () => {
    const input = boreInput();
    expect(workStiffness(input.work, surfaceOf(input))).toBe('stiff');
  });

  it('holds 40 mm of steel, 150 mm between centres, at 368 167 N/mm (48 E I / L³ in mathjs)', () => {
    const expected = evaluate('48 * 206000 * (pi * 40^4 / 64) / 150^3');
    const input = outsideInput();
    expect(workStiffness(input.work, surfaceOf(input))).toMatchObject({
      value: expect.closeTo(Number(expected), 3),
    });
  });

  it('holds a shaft between centres sixteen times as stiff as out of the chuck', () => {
    const input = outsideInput();
    const k = (holding: 'centres' | 'chuck') => {
      const work = workStiffness({ ...input.work, holding }, surfaceOf(input));
      return work === 'stiff' ? NaN : (work.value ?? NaN);
    };
    expect(k('centres') / k('chuck')).toBeCloseTo(16, 9);
  });
});
