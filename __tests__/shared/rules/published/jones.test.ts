/** Jones, Turning and Boring: cutting speeds. */
import { rpmForSurfaceSpeed } from '@/shared/rules/speed';

describe('turns for a surface speed (Jones, Turning and Boring; handbook)', () => {
  it('gives 46 rpm for 60 ft/min at 5 in', () => {
    expect(Math.round(rpmForSurfaceSpeed(60 * 0.3048, 5 * 25.4) ?? NaN)).toBe(46);
  });
});
