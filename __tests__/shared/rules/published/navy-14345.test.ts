/** US Navy training course 14345: taper turning. */
import { halfAngle, tailstockSetover, taperPerLength } from '@/shared/rules/taper';

const INCH = 25.4;

describe('US Navy 14345', () => {
  it('sets over 1/2 in for a piece 12 in long that tapers from 3 to 2 in', () => {
    const taper = taperPerLength(halfAngle(3 * INCH, 2 * INCH, 12 * INCH));
    expect((tailstockSetover(12 * INCH, taper).value ?? NaN) / INCH).toBeCloseTo(1 / 2, 9);
  });
});
