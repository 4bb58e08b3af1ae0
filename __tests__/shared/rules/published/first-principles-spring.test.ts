/** From first principles, checked numerically: infeed against spring, and the stepped quill. */
import { Solver } from 'odex';

import { firstPrinciplesSpring } from '@/shared/rules/published/first-principles-spring';
import { bendingOf, QUILL_MATERIAL } from '@/shared/rules/quill';
import { planPasses } from '@/shared/rules/schedule';

import { checkPublished } from '../../../support/published';

checkPublished(firstPrinciplesSpring);

describe('a whole schedule against the differential equation of decay (odex; derived)', () => {
  /** dx/dt = -x/tau for one pass: what is cut is what the spring loses. */
  function onePass(springMm: number, passOverTau: number): number {
    const solver = new Solver(1);
    solver.absoluteTolerance = 1e-14;
    solver.relativeTolerance = 1e-12;
    const decay = (_t: number, [x = 0]: number[]) => [-passOverTau * x];
    return solver.solve(decay, 0, [springMm], 1).y[0] ?? NaN;
  }

  it('follows it pass by pass, each stage with its own time constant', () => {
    const [roughTau, finishTau] = [0.9, 2.1];
    const { passes } = planPasses({
      stockMm: 0.1,
      finishStockMm: 0.02,
      rough: {
        infeedMm: 0.0125,
        stepMm: 0.0025,
        divisionMm: 0.005,
        cutFraction: 1 - Math.exp(-roughTau),
      },
      finish: {
        infeedMm: 0.005,
        stepMm: 0.0025,
        divisionMm: 0.005,
        cutFraction: 1 - Math.exp(-finishTau),
      },
      springLeftMm: 0.0005,
      sparkOuts: null,
    });
    expect(passes.length).toBeGreaterThan(10);
    let spring = 0;
    for (const pass of passes) {
      const pressed = spring + pass.infeedMm;
      spring = onePass(pressed, pass.stage.startsWith('rough') ? roughTau : finishTau);
      expect(pass.springMm).toBeCloseTo(spring, 9);
      expect(pass.cutMm).toBeCloseTo(pressed - spring, 9);
    }
  });
});

describe('a stepped steel quill, 30 mm of 10 mm at the wheel and 50 mm of 20 mm (derived)', () => {
  const segments = [
    { lengthMm: 30, diameterMm: 10 },
    { lengthMm: 50, diameterMm: 20 },
  ];

  it('agrees with the double integral of its curvature', () => {
    const steps = 200_000;
    const dx = 80 / steps;
    let [slope, deflection] = [0, 0];
    for (let i = 0; i < steps; i += 1) {
      const fromWheel = 80 - (i + 0.5) * dx;
      const diameter = fromWheel < 30 ? 10 : 20;
      const curvature = fromWheel / (206_000 * ((Math.PI * diameter ** 4) / 64));
      deflection += slope * dx + (curvature * dx * dx) / 2;
      slope += curvature * dx;
    }
    const bent = bendingOf(segments, QUILL_MATERIAL.steel);
    expect(bent?.deflectionMmPerN).toBeCloseTo(deflection, 9);
    expect(bent?.slopePerN).toBeCloseTo(slope, 9);
  });
});
