/** Lautard, The Machinist's Bedside Reader: the compound slide set over for tenths. */
import { compoundAngle } from '@/shared/rules/dial';

const minutes = (degrees: number, minutesOfArc: number) => degrees + minutesOfArc / 60;
const HALF_A_MINUTE = 0.5 / 60;

describe("Lautard, The Machinist's Bedside Reader", () => {
  it('feeds a tenth for a thousandth at 5 degrees 44 minutes', () => {
    const angle = compoundAngle(0.0001 * 25.4, 0.001 * 25.4).value ?? NaN;
    expect(Math.abs(angle - minutes(5, 44))).toBeLessThan(HALF_A_MINUTE);
  });

  it('feeds a tenth on diameter for a thousandth at 2 degrees 52 minutes', () => {
    const angle = compoundAngle(0.00005 * 25.4, 0.001 * 25.4).value ?? NaN;
    expect(Math.abs(angle - minutes(2, 52))).toBeLessThan(HALF_A_MINUTE);
  });
});
