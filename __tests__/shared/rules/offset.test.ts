import { Matrix, solve } from 'ml-matrix';

import {
  eccentricity,
  highSpot,
  offsetAt,
  offsetFromRunOut,
  offsetLine,
  tiltOver,
} from '@/shared/rules/offset';

describe('an offset from a run-out', () => {
  it('is half of it, toward the high spot', () => {
    const offset = offsetFromRunOut(0.1, 30);
    expect(eccentricity(offset).value).toBeCloseTo(0.05, 12);
    expect(highSpot(offset)).toBeCloseTo(30, 9);
    expect(highSpot(offsetFromRunOut(0.1, -90))).toBeCloseTo(270, 9);
    expect(highSpot({ aMm: 0, bMm: 0 })).toBe(0);
  });
});

describe('the line of centres', () => {
  const near = { zMm: 20, ...offsetFromRunOut(0.04, 0) };
  const far = { zMm: 120, ...offsetFromRunOut(0.1, 90) };

  it('passes through two planes', () => {
    const line = offsetLine([near, far]);
    expect(line && offsetAt(line, 20)).toMatchObject({
      aMm: expect.closeTo(0.02, 12),
      bMm: expect.closeTo(0, 12),
    });
    expect(line && offsetAt(line, 120)).toMatchObject({
      aMm: expect.closeTo(0, 12),
      bMm: expect.closeTo(0.05, 12),
    });
  });

  it('tilts by the distance between the centres over the distance between the planes', () => {
    const line = offsetLine([near, far]);
    expect(line && tiltOver(line, 100).value).toBeCloseTo(Math.hypot(0.02, 0.05), 12);
    expect(line && tiltOver(line, 40).value).toBeCloseTo(0.4 * Math.hypot(0.02, 0.05), 12);
  });

  it('shows no tilt with one plane, or with planes at one distance', () => {
    const one = offsetLine([near]);
    expect(one && tiltOver(one, 100).value).toBe(0);
    expect(one && offsetAt(one, 500).aMm).toBeCloseTo(0.02, 12);
    const same = offsetLine([near, { ...far, zMm: 20 }]);
    expect(same && tiltOver(same, 100).value).toBe(0);
    expect(same && offsetAt(same, 20).bMm).toBeCloseTo(0.025, 12);
  });

  it('is null without planes', () => {
    expect(offsetLine([])).toBeNull();
  });

  it('is the least-squares line through more planes (ml-matrix)', () => {
    const planes = [
      { zMm: 10, aMm: 0.01, bMm: -0.02 },
      { zMm: 40, aMm: 0.025, bMm: -0.01 },
      { zMm: 90, aMm: 0.02, bMm: 0.015 },
      { zMm: 150, aMm: 0.05, bMm: 0.01 },
    ];
    const design = new Matrix(planes.map(({ zMm }) => [1, zMm]));
    const reference = solve(design, new Matrix(planes.map(({ aMm, bMm }) => [aMm, bMm])));
    const line = offsetLine(planes);
    expect(line?.at0.aMm).toBeCloseTo(reference.get(0, 0), 12);
    expect(line?.at0.bMm).toBeCloseTo(reference.get(0, 1), 12);
    expect(line?.perMm.aMm).toBeCloseTo(reference.get(1, 0), 12);
    expect(line?.perMm.bMm).toBeCloseTo(reference.get(1, 1), 12);
  });
});
