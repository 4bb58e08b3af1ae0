import type { LookResult, RingResult, WheelRecord } from '@/shared/domain/wheels';

const unmarked: WheelRecord = {
  marking: null,
  shape: '1',
  diameterNewMm: 0,
  widthMm: 0,
  holeMm: 0,
  markedRpm: null,
  markedSpeedMPerS: null,
  markingReadOn: null,
  mounted: null,
  smallestUsableMm: null,
  madeOn: null,
  expiresOn: null,
  place: null,
  notes: null,
};

interface Receipt {
  on: string;
  diameterMm: number | null;
  looked: LookResult | null;
  rung: RingResult | null;
}

type Size = readonly [diameterMm: number, widthMm: number, holeMm: number];

interface Came {
  /** On which day it came; it was looked at and found sound. */
  on: string;
  rung?: RingResult | null;
}

/** A new wheel of a size, where it hangs, and what else is known of it. */
const wheel = (
  number: number,
  [diameterNewMm, widthMm, holeMm]: Size,
  { on, rung = 'clear', ...facts }: Came & Partial<WheelRecord>,
) => {
  const received: Receipt = { on, diameterMm: null, looked: 'sound', rung };
  return {
    id: `01900000-0000-7000-8000-0000000004${String(number).padStart(2, '0')}`,
    tag: `W${String(number).padStart(2, '0')}`,
    data: { ...unmarked, diameterNewMm, widthMm, holeMm, ...facts },
    received,
  };
};

const board = {
  markedSpeedMPerS: 35,
  markingReadOn: 'blotter',
  place: 'Board by the lathe',
} as const;
const drawer = {
  markedSpeedMPerS: 35,
  markingReadOn: 'box',
  rung: 'silent',
  place: 'Drawer 2',
} as const;

export const outsideWheel = wheel(1, [125, 20, 20], {
  on: '2025-09-08',
  marking: 'A 60 L 7 V',
  markedRpm: 5345,
  smallestUsableMm: 78,
  ...board,
});

export const wornWheel = wheel(2, [125, 13, 20], {
  on: '2025-02-03',
  marking: 'A 80 L 7 V',
  markedRpm: 5345,
  smallestUsableMm: 78,
  ...board,
});

export const droppedWheel = wheel(3, [150, 20, 20], {
  on: '2025-05-19',
  marking: 'C 36 J 8 V',
  markedRpm: 4455,
  smallestUsableMm: 90,
  ...board,
  place: 'Red shelf',
});

export const jawWheel = wheel(6, [25, 25, 8], {
  on: '2025-10-06',
  marking: 'A 60 K 6 V',
  markedRpm: 26_700,
  smallestUsableMm: 15,
  ...drawer,
});

export const boreWheel = wheel(7, [32, 20, 8], {
  on: '2025-10-06',
  marking: 'A 60 L 6 V',
  markedRpm: 20_850,
  smallestUsableMm: 16,
  ...drawer,
});

export const untestedWheel = wheel(8, [40, 25, 8], {
  on: '2025-03-17',
  marking: 'A 60 K 8 V',
  markedRpm: 16_700,
  smallestUsableMm: 18,
  ...drawer,
  rung: null,
  notes: 'Came back from the night shift without its box.',
});

/** Something for each kind of work, and the cases a rack always has: worn, unmarked, expired, set aside. */
export const wheels = [
  outsideWheel,
  wornWheel,
  droppedWheel,
  wheel(4, [100, 16, 20], { on: '2025-07-14', marking: 'A 46 J 8 V', markedRpm: 6680, ...board }),
  wheel(5, [100, 10, 20], {
    on: '2024-01-22',
    marking: 'A 80 P 4 B',
    markedRpm: 8590,
    markedSpeedMPerS: 45,
    markingReadOn: 'wheel',
    rung: 'silent',
    madeOn: '2022-03-31',
    expiresOn: '2025-03-31',
    place: 'Cupboard',
  }),
  jawWheel,
  boreWheel,
  untestedWheel,
  wheel(9, [20, 16, 6], { on: '2025-11-10', marking: 'A 80 L 6 V', markedRpm: 33_400, ...drawer }),
  wheel(10, [30, 20, 8], { on: '2024-06-03', rung: 'silent', place: 'Cupboard' }),
  wheel(11, [16, 20, 0], {
    on: '2025-11-10',
    marking: 'A 80 M 5 V',
    shape: '52',
    markingReadOn: 'box',
    rung: null,
    mounted: {
      mandrelDiameterMm: 6,
      overhangMm: 13,
      threaded: false,
      makerMaximumRpm: 34_500,
    },
    place: 'Drawer 3',
  }),
  wheel(12, [25, 20, 8], { on: '2025-12-01', marking: 'C 60 K 6 V', markedRpm: 26_700, ...drawer }),
];
