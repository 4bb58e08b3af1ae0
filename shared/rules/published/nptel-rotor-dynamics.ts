import { bendingOf, tipMassFrequency } from '../quill';
import { casesOf } from './case';

const NOTE = 'The source gives the beam; the figure was worked out from it.';

/** Without a mass of its own, as the example takes it. */
const beam = () => bendingOf([{ lengthMm: 200, diameterMm: 10 }], { modulus: 210_000, density: 0 });
const newtonsPerMm = () => 1 / (beam()?.deflectionMmPerN ?? NaN);

export const nptelRotorDynamics = casesOf('nptel-rotor-2-9', [
  {
    checks: 'Stiffness of a cantilever at its end',
    inputs: '0.2 m long, 10 mm thick, E 2.1 × 10¹¹ N/m²',
    note: NOTE,
    expected: 38_656,
    unit: 'N/m',
    tolerance: { within: 0.5 },
    got: () => 1000 * newtonsPerMm(),
  },
  {
    checks: 'Critical speed with a mass at its end',
    inputs: 'the same without mass of its own, 1 kg at the end',
    note: NOTE,
    expected: 1877.5,
    unit: 'rpm',
    tolerance: { within: 0.05 },
    got: () => 60 * tipMassFrequency(newtonsPerMm(), 1, 0),
  },
]);
