/** Modern Grinding Technology (web handbook), "Dresser overlays": speeds of its worked example. */
import { unit } from 'mathjs';

import { rpmOfMarkedSpeed } from '@/shared/rules/limits';
import { wheelSpeed } from '@/shared/rules/speed';

describe('a 406 mm wheel at 30 m/s (Modern Grinding Technology; handbook)', () => {
  it('turns at 1410 rpm, within 2', () => {
    expect(Math.abs((rpmOfMarkedSpeed(30, 406).value ?? NaN) - 1410)).toBeLessThanOrEqual(2);
  });

  it('travels 5900 ft/min at its rim, within 6', () => {
    const metresPerSecond = wheelSpeed(406, 1410).value ?? NaN;
    const feetPerMin = unit(metresPerSecond, 'm/s').toNumber('ft/min');
    expect(Math.abs(feetPerMin - 5900)).toBeLessThanOrEqual(6);
  });
});
