import fc from 'fast-check';

import type { PlanInput } from '@/shared/domain/setups';
import { FINDINGS, findingWords, planSetup, type Plan } from '@/shared/rules';
import { SOURCES } from '@/shared/rules/sources';

import { anyPlanInput } from '../../support/plan-arbitraries';
import { GOOD_INPUTS, jawsInput } from '../../support/plan-inputs';

/** PLAN_RUNS=100000 for the long run. */
const RUNS = Number(process.env.PLAN_RUNS ?? 5000);

function everyNumber(
  value: unknown,
  visit: (number: number, path: string) => void,
  path = '',
): void {
  if (typeof value === 'number') visit(value, path);
  else if (typeof value === 'object' && value !== null)
    for (const [key, inner] of Object.entries(value)) everyNumber(inner, visit, `${path}.${key}`);
}

/** Plain throws: matchers would take longer than the plans. */
function demand(holds: boolean, what: string): void {
  if (!holds) throw new Error(what);
}

function checkWords(plan: Plan): void {
  for (const found of plan.findings) {
    const entry = FINDINGS[found.code];
    const { title, remedy } = findingWords(found, ({ value, unit }) => `${value} ${unit}`);
    demand(!/[{}]|undefined|NaN/.test(title + remedy), `${found.code}: ${title} ${remedy}`);
    demand(
      entry.levels.some((level) => level === found.level),
      `${found.code} at ${found.level}`,
    );
    for (const [, key = ''] of (entry.title + entry.remedy).matchAll(/\{(\w+)\}/g))
      demand(key in found.figures || key in found.names, `${found.code} lacks ${key}`);
    demand(found.source in SOURCES, `${found.code} cites ${found.source}`);
  }
}

describe('a plan from anything the fields can hold', () => {
  it(
    'is finite throughout, words its findings whole, and says why it is not clear',
    () => {
      fc.assert(
        fc.property(anyPlanInput, (input) => {
          const plan = planSetup(input);
          everyNumber(plan, (number, path) => {
            if (!Number.isFinite(number)) throw new Error(`${path} is ${number}`);
          });
          checkWords(plan);
          demand(plan.verdict !== 'incomplete' || plan.needs.length > 0, 'needs nothing');
          if (plan.verdict === 'stop' || plan.verdict === 'check')
            demand(
              plan.findings.some(({ level }) => level === plan.verdict),
              'has no reason',
            );
          if (plan.verdict === 'clear' || plan.verdict === 'check') expectWhole(plan);
        }),
        { numRuns: RUNS },
      );
    },
    RUNS * 20 + 60_000,
  );

  it('is the same plan twice, and leaves its input alone', () => {
    fc.assert(
      fc.property(anyPlanInput, (input) => {
        const before = structuredClone(input);
        const plan = planSetup(input);
        expect(input).toEqual(before);
        expect(planSetup(structuredClone(input))).toEqual(plan);
      }),
      { numRuns: 200 },
    );
  });
});

/** A plan that may be run holds every figure that running it takes. */
function expectWhole(plan: Plan): void {
  const needed = [
    plan.speed.spindleRpm,
    plan.speed.wheelSpeed,
    plan.work.latheRpm,
    plan.work.workSpeed,
    plan.stock,
    plan.infeed.rough,
    plan.infeed.finish,
    plan.limits.governing?.rpm,
  ];
  for (const figure of needed) expect(figure?.value).not.toBeNull();
}

describe('passes', () => {
  it('take off what was asked, less than one settable step short and never more', () => {
    fc.assert(
      fc.property(
        fc.constantFrom(...Object.values(GOOD_INPUTS)),
        fc.record({
          stockMm: fc.double({ min: 0.02, max: 1, noNaN: true }),
          finishStockMm: fc.double({ min: 0.001, max: 0.2, noNaN: true }),
          roughInfeedMm: fc.option(fc.double({ min: 0.0025, max: 0.05, noNaN: true }), {
            nil: null,
          }),
        }),
        (make, { stockMm, finishStockMm, roughInfeedMm }) => {
          const base = make();
          const input: PlanInput = {
            ...base,
            work: { ...base.work, stockOnDiameterMm: stockMm },
            cut: { ...base.cut, finishStockMm, roughInfeedMm },
          };
          const plan = planSetup(input);
          const asked = plan.stock.value ?? NaN;
          const fed = plan.passes.reduce((sum, pass) => sum + pass.infeedMm, 0);
          const cut = plan.passes.reduce((sum, pass) => sum + pass.cutMm, 0);
          const halfDivisionOnRadius = 0.0025;
          expect(fed).toBeLessThanOrEqual(asked + 1e-9);
          expect(fed).toBeGreaterThan(asked - halfDivisionOnRadius - 1e-9);
          expect(cut).toBeLessThanOrEqual(fed + 1e-9);
          expect(fed - cut).toBeCloseTo(plan.passes.at(-1)?.springMm ?? NaN, 9);
        },
      ),
      { numRuns: 300 },
    );
  });

  it('are set in whole or half divisions of the dial', () => {
    fc.assert(
      fc.property(fc.double({ min: 0.02, max: 0.6, noNaN: true }), (stockOnDiameterMm) => {
        const base = GOOD_INPUTS.outside();
        const plan = planSetup({ ...base, work: { ...base.work, stockOnDiameterMm } });
        for (const { divisions } of plan.passes)
          expect(
            Math.abs((divisions ?? NaN) * 2 - Math.round((divisions ?? NaN) * 2)),
          ).toBeLessThan(1e-6);
      }),
      { numRuns: 200 },
    );
  });
});

const RANK = { stop: 0, incomplete: 1, check: 2, clear: 3 };

describe('a stricter marking', () => {
  const marked = fc.record({
    make: fc.constantFrom(...Object.values(GOOD_INPUTS)),
    beltStepId: fc.constantFrom('a', 'b', 'c', null),
    markedRpm: fc.option(fc.double({ min: 2000, max: 40_000, noNaN: true }), { nil: null }),
    markedSpeedMPerS: fc.option(fc.double({ min: 10, max: 60, noNaN: true }), { nil: null }),
    share: fc.double({ min: 0.05, max: 1, noNaN: true }),
  });

  it('never turns Stop into anything better, and never allows a step that was locked out', () => {
    const seen = new Set<string>();
    fc.assert(
      fc.property(marked, ({ make, beltStepId, markedRpm, markedSpeedMPerS, share }) => {
        const input = make();
        const at = (factor: number) =>
          planSetup({
            ...input,
            machine: { ...input.machine, beltStepId },
            wheelData: input.wheelData && {
              ...input.wheelData,
              markedRpm: markedRpm && markedRpm * factor,
              markedSpeedMPerS: markedSpeedMPerS && markedSpeedMPerS * factor,
            },
          });
        const [before, after] = [at(1), at(share)];
        seen.add(`${before.verdict} ${after.verdict}`);
        expect(RANK[after.verdict]).toBeLessThanOrEqual(RANK[before.verdict]);
        before.speed.steps.forEach((step, index) => {
          if (step.allowed === false) expect(after.speed.steps[index]?.allowed).toBe(false);
        });
      }),
      { numRuns: 1000 },
    );
    expect([...seen]).toEqual(expect.arrayContaining(['clear clear', 'clear stop', 'stop stop']));
  });
});

describe('clean-up of equal jaws', () => {
  const equal = (runOutMm: number, highSpotDeg: number, jawBoreMm: number) => {
    const base = jawsInput();
    return planSetup({
      ...base,
      work: {
        ...base.work,
        jawBoreMm,
        nearRunOutMm: runOutMm,
        farRunOutMm: runOutMm,
        nearHighSpotDeg: highSpotDeg,
        farHighSpotDeg: highSpotDeg,
      },
    }).jaws;
  };

  it('lies between 1.5 e and 2 e, and stays when chuck and high spot turn together', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 0.01, max: 0.3, noNaN: true }),
        fc.double({ min: 0, max: 360, noNaN: true }),
        fc.double({ min: 30, max: 90, noNaN: true }),
        (runOutMm, highSpotDeg, boreMm) => {
          const jaws = equal(runOutMm, highSpotDeg, boreMm);
          const e = runOutMm / 2;
          expect(jaws?.cleanUp.value).toBeGreaterThanOrEqual(1.5 * e - 1e-9);
          expect(jaws?.cleanUp.value).toBeLessThanOrEqual(2 * e + 1e-9);
          expect(equal(runOutMm, highSpotDeg + 120, boreMm)?.cleanUp.value).toBeCloseTo(
            jaws?.cleanUp.value ?? NaN,
            9,
          );
        },
      ),
      { numRuns: 100 },
    );
  });
});
