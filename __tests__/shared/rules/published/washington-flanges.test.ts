/** WAC 296-806-40516: flanges of at least a third of the wheel. */
import { leastFlange } from '@/shared/rules/mounting';

describe('the flange for a 175 mm wheel (WAC 296-806-40516; law)', () => {
  it('is at least 58.33 mm', () => {
    expect(leastFlange(175).value).toBeCloseTo(58.33, 2);
  });
});
