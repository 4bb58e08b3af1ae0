import { unit } from 'mathjs';

import { modernGrindingSpeed } from '@/shared/rules/published/modern-grinding-technology-speed';
import { wheelSpeed } from '@/shared/rules/speed';

import { checkPublished } from '../../../support/published';

checkPublished(modernGrindingSpeed);

it('comes to the same 5 900 ft/min when mathjs converts the metres', () => {
  const metresPerSecond = wheelSpeed(406, 1410).value ?? NaN;
  const feetPerMin = unit(metresPerSecond, 'm/s').toNumber('ft/min');
  expect(Math.abs(feetPerMin - 5900)).toBeLessThanOrEqual(6);
});
