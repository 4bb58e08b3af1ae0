import fc from 'fast-check';
import { levenbergMarquardt } from 'ml-levenberg-marquardt';

import { stated } from '@/shared/rules/figures';
import {
  expectedFraction,
  observedFraction,
  softness,
  sparkOutLesson,
} from '@/shared/rules/learning';
import { cutFraction, takePass } from '@/shared/rules/spring';

const GAUGE_MM = 0.0005;

/** What a gauge would read under spark-out, rounded to its steps unless it is ideal. */
function changes(fraction: number, firstSpringMm: number, stepMm: number | null): number[] {
  let springMm = firstSpringMm;
  return Array.from({ length: 6 }, () => {
    const taken = takePass(0, springMm, fraction);
    springMm = taken.springMm;
    return stepMm === null ? taken.cutMm : Math.round(taken.cutMm / stepMm) * stepMm;
  });
}

describe('the cut fraction that a run showed', () => {
  it('is the one it was cut with', () => {
    fc.assert(
      fc.property(fc.double({ min: 0.15, max: 0.85, noNaN: true }), (fraction) => {
        expect(observedFraction(changes(fraction, 0.1, null), 1e-9)).toBeCloseTo(fraction, 9);
      }),
    );
  });

  it('comes within a tenth of it through a gauge that rounds', () => {
    for (const fraction of [0.3, 0.45, 0.6, 0.7])
      expect(
        Math.abs((observedFraction(changes(fraction, 0.03, GAUGE_MM), GAUGE_MM) ?? NaN) - fraction),
      ).toBeLessThan(0.1);
  });

  it('agrees with a fit of the decay by least squares (ml-levenberg-marquardt)', () => {
    const measured = [0.0102, 0.0061, 0.004, 0.0022];
    const fit = levenbergMarquardt(
      { x: measured.map((_, pass) => pass), y: measured },
      ([first = 0, ratio = 0]: number[]) =>
        (pass: number) =>
          first * ratio ** pass,
      { initialValues: [0.01, 0.5], maxIterations: 200, gradientDifference: 1e-6 },
    );
    const ratio = fit.parameterValues[1] ?? NaN;
    expect(Math.abs((observedFraction(measured, GAUGE_MM) ?? NaN) - (1 - ratio))).toBeLessThan(
      0.03,
    );
  });

  it('leaves out what the gauge cannot tell, and all after it', () => {
    expect(observedFraction([0.008, 0.004, 0.0015, 0.01], GAUGE_MM)).toBeCloseTo(0.5, 9);
    expect(observedFraction([0.008, 0.0015], GAUGE_MM)).toBeNull();
    expect(observedFraction([], GAUGE_MM)).toBeNull();
  });

  it('is not known where the changes do not shrink', () => {
    expect(observedFraction([0.004, 0.004], GAUGE_MM)).toBeNull();
    expect(observedFraction([0.004, 0.006], GAUGE_MM)).toBeNull();
  });
});

describe('what is learned', () => {
  const cut = { traverseMm: 1.2, workMPerS: 0.35, wheelMPerS: 22 };

  it('gives the observed fraction back where nothing changed', () => {
    expect(expectedFraction(softness(0.62, cut), cut).value).toBeCloseTo(0.62, 12);
  });

  it('follows the computed one to another traverse and speed', () => {
    const at = (conditions: typeof cut) =>
      cutFraction(stated('stiffness', [2000, 'N/mm']), {
        ...conditions,
        energy: 38,
        forceRatio: 0.4,
      }).value ?? NaN;
    const next = { traverseMm: 0.4, workMPerS: 0.25, wheelMPerS: 28 };
    expect(expectedFraction(softness(at(cut), cut), next).value).toBeCloseTo(at(next), 9);
  });

  it('is unknown until something was learned', () => {
    expect(expectedFraction(null, cut).value).toBeNull();
  });
});

describe('what sizes read during spark-out teach', () => {
  const cut = { traverseMm: 1, workMPerS: 0.25, wheelMPerS: 25 };
  const lesson = (changesMm: number[], resolutionMm = 0.0005) =>
    sparkOutLesson(changesMm, resolutionMm, cut);

  it('is the softness that gives the observed fraction back', () => {
    const { fraction, softness: learned, silence } = lesson([0.01, 0.006, 0.0036]);
    expect(silence).toBeNull();
    expect(fraction.value).toBeCloseTo(0.4, 9);
    expect(expectedFraction(learned.value, cut).value).toBeCloseTo(0.4, 9);
  });

  it.each([
    ['too few', [0.01]],
    ['too small', [0.0016, 0.0012]],
    ['too small', [0.0016, 0.0015]],
    ['not shrinking', [0.004, 0.004]],
    ['not shrinking', [0.004, 0.006]],
    ['not shrinking', [-0.008, -0.004]],
  ])('is nothing where the changes are %s', (why, changesMm) => {
    const { fraction, softness: learned, silence } = lesson(changesMm);
    expect(silence).toBe(why);
    expect(fraction.value).toBeNull();
    expect(learned.value).toBeNull();
  });

  it('waits for the speeds, with the fraction known already', () => {
    const waiting = sparkOutLesson([0.008, 0.004], 0.0005, { ...cut, wheelMPerS: null });
    expect(waiting.fraction.value).toBeCloseTo(0.5, 9);
    expect(waiting.softness.value).toBeNull();
    expect(waiting.silence).toBeNull();
  });

  it('leaves a softness that no plan can hold', () => {
    const soft = sparkOutLesson([0.01, 0.0099], 0.0001, { ...cut, traverseMm: 0.0001 });
    expect(soft.silence).toBe('out of range');
  });
});
