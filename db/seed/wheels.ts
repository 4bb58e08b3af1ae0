import type { WheelData } from '@/shared/domain/wheels';

const sound: WheelData = {
  marking: null,
  diameterNewMm: 0,
  diameterNowMm: 0,
  widthMm: 0,
  holeMm: 0,
  markedRpm: null,
  markedSpeedMPerS: null,
  markingReadOn: null,
  mounted: null,
  looked: 'sound',
  rung: 'clear',
  expiresOn: null,
  state: 'on the rack',
  setAsideReason: null,
};

type Size = readonly [diameterMm: number, widthMm: number, holeMm: number];

/** A new wheel of a size, and what else is known of it. */
const wheel = (number: number, [diameterMm, widthMm, holeMm]: Size, facts: Partial<WheelData>) => ({
  id: `01900000-0000-7000-8000-0000000004${String(number).padStart(2, '0')}`,
  tag: `W${String(number).padStart(2, '0')}`,
  data: {
    ...sound,
    diameterNewMm: diameterMm,
    diameterNowMm: diameterMm,
    widthMm,
    holeMm,
    ...facts,
  },
});

const onBlotter = { markedSpeedMPerS: 35, markingReadOn: 'blotter' } as const;
const onBox = { markedSpeedMPerS: 35, markingReadOn: 'box', rung: 'silent' } as const;

export const outsideWheel = wheel(1, [125, 20, 20], {
  marking: 'A 60 L 7 V',
  markedRpm: 5345,
  ...onBlotter,
  state: 'mounted',
});

export const jawWheel = wheel(6, [25, 25, 8], {
  marking: 'A 60 K 6 V',
  markedRpm: 26_700,
  ...onBox,
});

export const boreWheel = wheel(7, [32, 20, 8], {
  marking: 'A 60 L 6 V',
  markedRpm: 20_850,
  ...onBox,
});

/** Something for each kind of work, and the cases a rack always has: worn, unmarked, expired, set aside. */
export const wheels = [
  outsideWheel,
  wheel(2, [125, 13, 20], {
    marking: 'A 80 L 7 V',
    diameterNowMm: 107.5,
    markedRpm: 5345,
    ...onBlotter,
  }),
  wheel(3, [150, 20, 20], {
    marking: 'C 36 J 8 V',
    markedRpm: 4455,
    ...onBlotter,
    rung: 'dull',
    state: 'set aside',
    setAsideReason: 'Rang dull after it was dropped on the bench.',
  }),
  wheel(4, [100, 16, 20], { marking: 'A 46 J 8 V', markedRpm: 6680, ...onBlotter }),
  wheel(5, [100, 10, 20], {
    marking: 'A 80 P 4 B',
    markedRpm: 8590,
    markedSpeedMPerS: 45,
    markingReadOn: 'wheel',
    rung: 'silent',
    expiresOn: '2025-03-31',
  }),
  jawWheel,
  boreWheel,
  wheel(8, [40, 25, 8], {
    marking: 'A 60 K 8 V',
    diameterNowMm: 36.2,
    markedRpm: 16_700,
    ...onBox,
  }),
  wheel(9, [20, 16, 6], { marking: 'A 80 L 6 V', markedRpm: 33_400, ...onBox }),
  wheel(10, [30, 20, 8], { looked: 'sound', rung: 'silent' }),
  wheel(11, [16, 20, 0], {
    marking: 'A 80 M 5 V',
    markingReadOn: 'box',
    rung: 'silent',
    mounted: {
      mandrelDiameterMm: 6,
      overhangMm: 13,
      threaded: false,
      makerMaximumRpm: 34_500,
    },
  }),
  wheel(12, [25, 20, 8], { marking: 'C 60 K 6 V', markedRpm: 26_700, ...onBox }),
];
