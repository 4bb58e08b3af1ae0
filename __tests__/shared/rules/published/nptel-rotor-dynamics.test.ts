/** NPTEL, Theory and Practice of Rotor Dynamics, example 2.9: a massless cantilever with 1 kg at its end. */
import { bendingOf, tipMassFrequency } from '@/shared/rules/quill';

describe('a cantilever of 0.2 m, 10 mm, E 2.1e11 N/m2 (NPTEL ex. 2.9; textbook)', () => {
  const bent = bendingOf([{ lengthMm: 200, diameterMm: 10 }], { modulus: 210_000, density: 0 });
  const stiffnessNPerMm = 1 / (bent?.deflectionMmPerN ?? NaN);

  it('has a stiffness of 38 656 N/m', () => {
    expect(stiffnessNPerMm * 1000).toBeCloseTo(38_656, 0);
  });

  it('whirls at 1 877.5 rpm (computed from the given inputs)', () => {
    expect(60 * tipMassFrequency(stiffnessNPerMm, 1, bent?.massKg ?? NaN)).toBeCloseTo(1877.5, 1);
  });
});
