import type { WheelEntryView, WheelLife } from '@/shared/contracts/wheel-entries';
import type { Wheel } from '@/shared/contracts/wheels';
import type { WheelStep } from '@/shared/domain/wheel-life';

import { PERSON_ID, stored } from './in-shop';

export const WHEEL_ID = '0190a000-0000-7000-8000-0000000000a1';
export const QUILL_ID = '0190a000-0000-7000-8000-0000000000c1';
const STEP_ID = '0190a000-0000-7000-8000-0000000000e1';
const GRINDER_ID = '0190a000-0000-7000-8000-0000000000b1';
export const OTHER_PERSON = '0190a000-0000-7000-8000-000000000009';

/** An invented wheel of the rack, whole and sound. */
export const rackWheel = (data: Partial<Wheel['data']> = {}): Wheel => ({
  ...stored,
  id: WHEEL_ID,
  version: 4,
  tag: 'R-14',
  typed: {},
  data: {
    marking: 'A 60 K 7 V',
    diameterNewMm: 32,
    diameterNowMm: 31,
    widthMm: 16,
    holeMm: 10,
    markedRpm: 14_000,
    markedSpeedMPerS: null,
    markingReadOn: 'box',
    mounted: null,
    looked: 'sound',
    rung: 'clear',
    expiresOn: null,
    state: 'on the rack',
    setAsideReason: null,
    unsigned: false,
    shape: '1',
    smallestUsableMm: 22,
    madeOn: null,
    place: 'Peg 4',
    notes: null,
    ...data,
  },
  life: { receivedOn: '2026-01-05', onSpindle: null, due: null, limitRpm: 14_000, usable: true },
});

/** An entry of the person who looks at the page, unless another is named. */
export const entry = (
  number: number,
  step: WheelStep,
  more: Partial<WheelEntryView> = {},
): WheelEntryView => ({
  id: `0190a000-0000-7000-8000-0000000001${String(number).padStart(2, '0')}`,
  number,
  at: '2026-03-01T10:00:00Z',
  happenedOn: '2026-03-01',
  person: { personId: PERSON_ID, name: 'Ada Quill' },
  needs: null,
  note: null,
  correctedBy: null,
  signedBy: null,
  step,
  ...more,
});

const choice = (
  kind: WheelLife['steps'][number]['kind'],
  refusal: string | null = null,
): WheelLife['steps'][number] => ({
  kind,
  refusal: refusal === null ? null : { code: 'any', words: refusal },
  needs: null,
});

/** What the server says of the wheel above, on the rack. */
export const wheelLife = (more: Partial<WheelLife> = {}): WheelLife => ({
  wheel: rackWheel(),
  standing: {
    onSpindle: null,
    lastTrialRun: null,
    longestTrialRunMinutes: 0,
    waiting: [],
    latestOn: '2026-01-05',
    dressings: 0,
    mountings: 0,
  },
  steps: [
    choice('inspected'),
    choice('ring test'),
    choice('mounted'),
    choice('trial run', 'The wheel is not mounted.'),
    choice('dressed', 'The wheel is not mounted.'),
    choice('used', 'The wheel is not mounted.'),
    choice('taken off', 'The wheel is not mounted.'),
    choice('set aside'),
    choice('returned', 'The wheel is not set aside.'),
    choice('scrapped'),
  ],
  spindles: [
    {
      grinderId: GRINDER_ID,
      grinderName: 'Post grinder B',
      quillId: QUILL_ID,
      quillName: 'Quill 18 × 85',
      refusal: null,
      limitRpm: 14_000,
      limitOf: 'marked rpm',
      steps: [
        { id: STEP_ID, name: 'A', rpm: 6000, wheelSpeedMPerS: 9.7, allowed: true },
        {
          id: '0190a000-0000-7000-8000-0000000000e2',
          name: 'B',
          rpm: 15_438,
          wheelSpeedMPerS: 25.1,
          allowed: false,
        },
      ],
      suggestedStepId: STEP_ID,
    },
    {
      grinderId: GRINDER_ID,
      grinderName: 'Post grinder B',
      quillId: '0190a000-0000-7000-8000-0000000000c2',
      quillName: 'Arbor 12.7',
      refusal: { code: 'hole-too-small', words: 'The hole does not go on it.' },
      limitRpm: 14_000,
      limitOf: 'marked rpm',
      steps: [],
      suggestedStepId: null,
    },
  ],
  setups: [],
  entries: { items: [entry(1, { kind: 'received', diameterMm: 32 })], next: null },
  ...more,
});

/** The same wheel on its quill, run in and ready to be dressed. */
export function mountedLife(more: Partial<WheelLife> = {}): WheelLife {
  const life = wheelLife();
  return {
    ...life,
    wheel: rackWheel({ state: 'mounted' }),
    standing: {
      ...life.standing,
      onSpindle: {
        entryId: entry(2, { kind: 'taken off' }).id,
        grinderId: GRINDER_ID,
        quillId: QUILL_ID,
      },
      longestTrialRunMinutes: 3,
      lastTrialRun: {
        entryId: entry(3, { kind: 'taken off' }).id,
        happenedOn: '2026-03-01',
        minutes: 3,
        spindleRpm: 6000,
        wheelSpeedMPerS: 9.7,
      },
      dressings: 1,
    },
    steps: [
      choice('trial run'),
      choice('dressed'),
      choice('taken off'),
      choice('mounted', 'The wheel is mounted already. Take it off first.'),
    ],
    ...more,
  };
}
