/** Machinery's Handbook, 31st ed., p. 1317, wheel markings for cylindrical grinding. */
import type { Material } from '@/shared/domain/materials';
import { recommendedMark, writeRecommended } from '@/shared/rules/recommended-marks';

const INCH = 25.4;

describe("Machinery's Handbook 31, p. 1317", () => {
  it.each<[string, Material, 'outside' | 'inside', number, string]>([
    ['general and soft steel', 'plain-carbon-annealed', 'outside', 2, 'A 54-60 L-M V'],
    ['soft alloy steel', 'alloy-annealed', 'outside', 0.5, 'A 54-60 L-M V'],
    ['hardened steel up to 1 in', 'tool-hardened', 'outside', 1, 'A 80 L V'],
    ['hardened steel over 1 in', 'tool-hardened', 'outside', 1.01, 'A 60 K V'],
    ['hardened bushings', 'alloy-hardened', 'inside', 1, 'A 60 L V'],
    ['cast iron', 'cast-iron', 'outside', 2, 'C 36 J V'],
    ['brass', 'copper-alloy', 'outside', 2, 'C 36 K V'],
    ['aluminium', 'aluminium-alloy', 'outside', 2, 'A 46 I V'],
    ['300 stainless', 'stainless', 'outside', 2, 'A 46 K V'],
  ])('recommends for %s', (_name, material, side, inches, mark) => {
    expect(writeRecommended(recommendedMark(material, side, inches * INCH))).toBe(mark);
  });
});
