/** Colvin, Turning and Boring Tapers: taper per inch of an included angle. */
import { halfOfIncluded, taperPerLength } from '@/shared/rules/taper';

describe('Colvin, Turning and Boring Tapers', () => {
  it.each([
    [5, 0.08732],
    [40, 0.72794],
    [50, 0.93262],
  ])('gives an included angle of %d degrees a taper of %d to the inch', (included, perInch) => {
    expect(taperPerLength(halfOfIncluded(included)).value).toBeCloseTo(perInch, 5);
  });
});
