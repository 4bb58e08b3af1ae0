import type { WheelStep } from '@/shared/domain/wheel-life';

import { outsideGrinder } from './machines';
import { lead, others } from './people';
import { droppedWheel, outsideWheel, untestedWheel, wornWheel } from './wheels';

const [machinist, apprentice] = others;
const by = { lead: lead.id, machinist: machinist.id, apprentice: apprentice.id };

type Happened = readonly [on: string, who: keyof typeof by, step: WheelStep];

const onShortArbor: WheelStep = {
  kind: 'mounted',
  grinderId: outsideGrinder.id,
  quillId: '01900000-0000-7000-8000-000000000331',
};
const trialRun: WheelStep = { kind: 'trial run', minutes: 3, spindleRpm: 4750 };
const dressed = (depthMm: number, passes: number): WheelStep => ({
  kind: 'dressed',
  depthMm,
  passes,
});
const sound: WheelStep = { kind: 'inspected', look: 'sound', diameterMm: null };

/** What was recorded of a wheel after it came, in order; each entry was made on the one before it. */
const life = (wheel: { id: string }, number: number, ...happened: Happened[]) =>
  happened.map(([happenedOn, who, step], index) => ({
    wheelId: wheel.id,
    personId: by[who],
    entry: {
      id: `01900000-0000-7000-8000-0000000006${number}${index.toString(16)}`,
      version: index + 1,
      happenedOn,
      note: null,
      step,
    },
  }));

export const wheelEntries = [
  ...life(
    outsideWheel,
    1,
    ['2026-01-12', 'machinist', onShortArbor],
    ['2026-01-12', 'machinist', trialRun],
    ['2026-01-12', 'machinist', dressed(0.02, 3)],
    ['2026-01-12', 'machinist', { kind: 'used', minutes: 45, diameterMm: null }],
  ),
  ...life(
    wornWheel,
    2,
    ['2025-04-07', 'lead', onShortArbor],
    ['2025-04-07', 'lead', trialRun],
    ['2025-04-07', 'lead', dressed(0.025, 4)],
    ['2025-04-07', 'lead', { kind: 'used', minutes: 240, diameterMm: 116.4 }],
    ['2025-08-18', 'lead', trialRun],
    ['2025-08-18', 'lead', dressed(0.025, 4)],
    ['2025-08-18', 'lead', { kind: 'used', minutes: 300, diameterMm: 107.5 }],
    ['2025-08-18', 'lead', { kind: 'taken off' }],
    ['2025-08-18', 'machinist', sound],
    ['2025-08-18', 'machinist', { kind: 'ring test', ring: 'clear' }],
  ),
  ...life(
    droppedWheel,
    3,
    ['2026-02-09', 'apprentice', { kind: 'ring test', ring: 'dull' }],
    [
      '2026-02-09',
      'apprentice',
      { kind: 'set aside', reason: 'Rang dull after it was dropped on the bench' },
    ],
  ),
  ...life(
    untestedWheel,
    4,
    ['2026-02-16', 'machinist', { kind: 'inspected', look: 'sound', diameterMm: 36.2 }],
    ['2026-02-23', 'apprentice', { kind: 'ring test', ring: 'silent' }],
  ),
];
