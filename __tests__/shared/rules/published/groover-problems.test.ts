/** Groover, Fundamentals of Modern Manufacturing, ch. 24, end-of-chapter problems: values from memory. */
import {
  contactLength,
  equivalentDiameter,
  grindingRatio,
  removalRate,
} from '@/shared/rules/contact';

/** Flat work is work of a very large diameter. */
const FLAT = 1e12;

describe('Groover, ch. 24 (values from memory)', () => {
  it('finds a contact 3.24 mm long for a 150 mm wheel 0.07 mm deep on flat work', () => {
    const length = contactLength(0.07, equivalentDiameter(150, FLAT, 'outside')).value;
    expect(length).toBeCloseTo(3.24, 2);
  });

  it('finds 5 250 mm3/min at 0.25 m/s, 5 mm wide and 0.07 mm deep', () => {
    // Flat work: 5 mm of width at 0.25 m/s stands for a circumference at a traverse.
    const perSecond = removalRate(5 / Math.PI, 0.07, 0.25 * 60_000).value ?? NaN;
    expect(perSecond * 60).toBeCloseTo(5250, 6);
  });

  it('finds a grinding ratio of 104.8 for a bore from 250 to 252.5 and a wheel from 150 to 149.75', () => {
    const ring = (large: number, small: number, length: number) =>
      (Math.PI / 4) * (large ** 2 - small ** 2) * length;
    const ratio = grindingRatio(ring(252.5, 250, 125), ring(150, 149.75, 20));
    expect(ratio).toBeCloseTo(104.8, 1);
  });
});
