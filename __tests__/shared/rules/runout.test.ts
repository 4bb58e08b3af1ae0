import fc from 'fast-check';
import { levenbergMarquardt } from 'ml-levenberg-marquardt';
import { Matrix, solve } from 'ml-matrix';

import { cleanUpStock, fitRunout, type Reading } from '@/shared/rules/runout';

const readings = (offset: [number, number, number], anglesDeg: number[]): Reading[] =>
  anglesDeg.map((angleDeg) => {
    const t = (angleDeg * Math.PI) / 180;
    return { angleDeg, readingMm: offset[0] + offset[1] * Math.cos(t) + offset[2] * Math.sin(t) };
  });

const anyReadings = fc
  .array(fc.tuple(fc.integer({ min: 0, max: 359 }), fc.double({ min: -1, max: 1, noNaN: true })), {
    minLength: 4,
    maxLength: 24,
  })
  .map((pairs) => pairs.map(([angleDeg, readingMm]) => ({ angleDeg, readingMm })));

describe('the circle through readings', () => {
  it('is found exactly from three readings at any angles', () => {
    const fit = fitRunout(readings([0.5, 0.03, -0.04], [10, 95, 250]));
    expect(fit?.meanMm).toBeCloseTo(0.5, 12);
    expect(fit?.aMm).toBeCloseTo(0.03, 12);
    expect(fit?.bMm).toBeCloseTo(-0.04, 12);
    expect(fit?.eccentricity.value).toBeCloseTo(0.05, 12);
    expect(fit?.highSpotDeg).toBeCloseTo(306.8699, 4);
  });

  it('says nothing of roundness or doubt from three readings, and says why', () => {
    const fit = fitRunout(readings([0, 0.1, 0], [0, 120, 240]));
    expect(fit?.outOfRound.value).toBeNull();
    expect(fit?.outOfRound.working.note).toMatch(/four or more/);
    expect(fit?.uncertainty.value).toBeNull();
    expect(fit?.uncertainty.working.note).toMatch(/fewer than four/i);
  });

  it('gives the run-out of its own circle, and where that stands highest', () => {
    const fit = fitRunout(readings([0.5, 0.03, -0.04], [10, 95, 250, 310]));
    expect(fit?.circleRunOut.value).toBeCloseTo(0.1, 12);
    expect(fit?.highSpot.value).toBeCloseTo(306.8699, 4);
    expect(fit?.highSpot.value).toBe(fit?.highSpotDeg);
  });

  it('needs three readings that are spread out', () => {
    expect(fitRunout([])).toBeNull();
    expect(fitRunout(readings([0, 1, 0], [0, 180]))).toBeNull();
    expect(fitRunout(readings([0, 1, 0], [0, 180, 360, 180]))).toBeNull();
    expect(fitRunout(readings([0, 1, 0], [40, 40.01, 40.02, 40.03]))).toBeNull();
    expect(fitRunout(readings([0, 1, 0], [0, 180, 90]))).not.toBeNull();
  });

  it('refuses what is not a number', () => {
    const holed = [...readings([0, 1, 0], [0, 90, 180]), { angleDeg: 270, readingMm: Number.NaN }];
    expect(fitRunout(holed)?.eccentricity.value ?? null).toBeNull();
  });

  it('sees an oval as out of round, not as off centre', () => {
    const oval = Array.from({ length: 12 }, (_, i) => ({
      angleDeg: 30 * i,
      readingMm: 0.01 * Math.cos((2 * Math.PI * 2 * i) / 12),
    }));
    const fit = fitRunout(oval);
    expect(fit?.eccentricity.value).toBeCloseTo(0, 12);
    expect(fit?.outOfRound.value).toBeCloseTo(0.02, 12);
    expect(fit?.runOut.value).toBeCloseTo(0.02, 12);
  });

  it('agrees with a general least-squares solver (ml-matrix)', () => {
    fc.assert(
      fc.property(anyReadings, (points) => {
        const fit = fitRunout(points);
        fc.pre(fit !== null);
        const radians = points.map(({ angleDeg }) => (angleDeg * Math.PI) / 180);
        const design = new Matrix(radians.map((t) => [1, Math.cos(t), Math.sin(t)]));
        const normal = design.transpose().mmul(design);
        const right = design.transpose().mmul(Matrix.columnVector(points.map((p) => p.readingMm)));
        const [mean, a, b] = solve(normal, right).to1DArray();
        const worst = Math.max(
          Math.abs((mean ?? NaN) - fit.meanMm),
          Math.abs((a ?? NaN) - fit.aMm),
          Math.abs((b ?? NaN) - fit.bMm),
        );
        return worst < 1e-6 * (1 + Math.hypot(fit.aMm, fit.bMm));
      }),
    );
  });

  it('agrees with the covariance of the general solver (ml-matrix) on how sure it is', () => {
    const points = readings([0, 0.05, 0.02], [0, 40, 95, 170, 200, 310]).map((point, i) => ({
      ...point,
      readingMm: point.readingMm + 1e-3 * Math.sin(7 * i + 1),
    }));
    const fit = fitRunout(points);
    const radians = points.map(({ angleDeg }) => (angleDeg * Math.PI) / 180);
    const design = new Matrix(radians.map((t) => [1, Math.cos(t), Math.sin(t)]));
    const inverse = solve(design.transpose().mmul(design), Matrix.eye(3));
    const sum = (fit?.residualsMm ?? []).reduce((total, r) => total + r * r, 0);
    const direction = ((fit?.highSpotDeg ?? 0) * Math.PI) / 180;
    const along = new Matrix([[0, Math.cos(direction), Math.sin(direction)]]);
    const variance = (sum / 3) * along.mmul(inverse).mmul(along.transpose()).get(0, 0);
    expect(fit?.uncertainty.value).toBeCloseTo(Math.sqrt(variance), 12);
  });

  it('agrees with a true circle fitted by ml-levenberg-marquardt while the offset is small', () => {
    const [radius, a, b] = [25, 0.06, -0.08];
    const angles = Array.from({ length: 16 }, (_, i) => (2 * Math.PI * i) / 16);
    const circle =
      ([r = 0, x = 0, y = 0]: number[]) =>
      (t: number) =>
        x * Math.cos(t) +
        y * Math.sin(t) +
        Math.sqrt(r * r - (x * Math.sin(t) - y * Math.cos(t)) ** 2);
    const distances = angles.map(circle([radius, a, b]));
    const fitted = levenbergMarquardt({ x: angles, y: distances }, circle, {
      initialValues: [24, 0.01, 0.01],
      damping: 1e-3,
      maxIterations: 200,
      errorTolerance: 1e-16,
    }).parameterValues;
    const fit = fitRunout(
      angles.map((t, i) => ({ angleDeg: (180 * t) / Math.PI, readingMm: distances[i] ?? NaN })),
    );
    expect(fitted[1]).toBeCloseTo(a, 6);
    expect(fit?.aMm).toBeCloseTo(fitted[1] ?? NaN, 3);
    expect(fit?.bMm).toBeCloseTo(fitted[2] ?? NaN, 3);
    expect(fit?.meanMm).toBeCloseTo(fitted[0] ?? NaN, 3);
  });

  it('turns with the angles and does not change with them', () => {
    fc.assert(
      fc.property(anyReadings, fc.integer({ min: 0, max: 359 }), (points, turn) => {
        const fit = fitRunout(points);
        fc.pre(fit !== null && Math.hypot(fit.aMm, fit.bMm) > 1e-3);
        const turned = fitRunout(points.map((p) => ({ ...p, angleDeg: p.angleDeg + turn })));
        const apart = (turned?.highSpotDeg ?? NaN) - fit.highSpotDeg - turn;
        const same = Math.abs(
          (turned?.eccentricity.value ?? NaN) - (fit.eccentricity.value ?? NaN),
        );
        return same < 1e-6 && Math.abs(Math.sin((apart * Math.PI) / 360)) < 1e-4;
      }),
    );
  });
});

describe('stock to clean up round work', () => {
  it('is the run-out and the error of form together', () => {
    expect(cleanUpStock(0.08, 0.01).value).toBeCloseTo(0.09, 12);
    expect(cleanUpStock(0.08, 0).value).toBe(0.08);
  });

  it('is not known while the run-out is not', () => {
    expect(cleanUpStock(null, 0).value).toBeNull();
  });
});
