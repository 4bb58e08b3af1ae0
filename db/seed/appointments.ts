import type { AppointedTask } from '@/shared/domain/appointments';

import { lead, others } from './people';

const [machinist] = others;
const tasks: AppointedTask[] = ['mount', 'dress', 'trial run'];

/** Who may mount, dress and trial-run in the demo shop. */
export const appointments = [
  {
    id: '01900000-0000-7000-8000-000000000701',
    personId: lead.id,
    tasks,
    wheelClass: 'All wheels of the shop',
    from: '2025-01-06',
    until: null,
  },
  {
    id: '01900000-0000-7000-8000-000000000702',
    personId: machinist.id,
    tasks,
    wheelClass: 'Vitrified wheels up to 150 mm',
    from: '2025-09-01',
    until: '2028-08-31',
  },
];
