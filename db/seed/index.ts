import { appointments } from './appointments';
import { inchLathe, insideGrinder, metricLathe, outsideGrinder } from './machines';
import { lead, others, password } from './people';
import { setups } from './setups';
import { wheelEntries } from './wheel-lives';
import { wheels } from './wheels';

export { signIns } from './people';

/** A shop to look around in. Its people, its name and the makers of its machines are invented. */
export const demoShop = {
  id: '01900000-0000-7000-8000-000000000001',
  name: 'Brackenmoor Repair Shop',
  units: 'mm',
  timeZone: 'Europe/Lisbon',
  password,
  lead,
  others,
  lathes: [metricLathe, inchLathe],
  grinders: [outsideGrinder, insideGrinder],
  wheels,
  appointments,
  wheelEntries,
  setups,
} as const;
