/** Mathematical Problems in Engineering 2017, 1568019, table 1: a cantilever whose tip mass equals its own. */
import { bendingOf, tipMassFrequency } from '@/shared/rules/quill';

describe('a cantilever with a tip mass equal to its own (Math. Probl. Eng. 2017; textbook)', () => {
  const lengthM = 0.1;
  const material = { modulus: 206_000, density: 7850 };
  const bent = bendingOf([{ lengthMm: lengthM * 1000, diameterMm: 12 }], material);
  const massKg = bent?.massKg ?? NaN;
  const flexuralNm2 = 206e9 * ((Math.PI * 0.012 ** 4) / 64);
  const omega = 2 * Math.PI * tipMassFrequency(1 / (bent?.deflectionMmPerN ?? NaN), massKg, massKg);
  const betaSquared = omega * Math.sqrt((massKg * lengthM ** 3) / flexuralNm2);

  it('gives beta squared 1.558122 by the 33/140 form', () => {
    expect(betaSquared).toBeCloseTo(1.558122, 5);
  });

  it('stays within a tenth of a percent of the exact 1.557298', () => {
    expect(Math.abs(betaSquared / 1.557298 - 1)).toBeLessThan(0.001);
  });
});
