/** Jones, Turning and Boring: setting over the tailstock. */
import { stated } from '@/shared/rules/figures';
import { halfAngle, tailstockSetover, taperPerLength } from '@/shared/rules/taper';

const INCH = 25.4;
const perFoot = (inches: number) => stated('taper', [inches / 12, '1']);
const setover = (totalIn: number, taper: ReturnType<typeof perFoot>) =>
  (tailstockSetover(totalIn * INCH, taper).value ?? NaN) / INCH;

describe('Jones, Turning and Boring', () => {
  it('sets over 3/8 in for 1 in to the foot on a piece 9 in long', () => {
    expect(setover(9, perFoot(1))).toBeCloseTo(3 / 8, 9);
  });

  it('sets over 3/8 in for 2 1/2 to 2 in over 6 in of a piece 9 in long', () => {
    const taper = taperPerLength(halfAngle(2.5 * INCH, 2 * INCH, 6 * INCH));
    expect(setover(9, taper)).toBeCloseTo(3 / 8, 9);
  });

  it('sets over 1/2 in for 1 1/2 in to the foot on a piece 8 in long', () => {
    expect(setover(8, perFoot(1.5))).toBeCloseTo(1 / 2, 9);
  });
});
