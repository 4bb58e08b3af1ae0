import type { GrinderData, LatheData, QuillData } from '@/shared/domain/machines';
import type { WheelData } from '@/shared/domain/wheels';

/** Invented machines and wheels of ordinary sizes, for tests that need a whole plan. */
export const LATHE: LatheData = {
  spindleSpeedsRpm: [45, 70, 115, 180, 290, 460, 730, 1150, 1800],
  feedsMmPerRev: [0.05, 0.1, 0.15, 0.2, 0.3, 0.4, 0.5, 0.6, 0.8, 1, 1.2],
  crossSlideDivisionMm: 0.01,
  crossSlideReads: 'diameter',
  crossSlideDivisionsPerTurn: 200,
  compoundZero: 'cross-slide',
  compoundDivisionMm: 0.02,
  compoundTravelMm: 90,
  compoundMmPerTurn: 2,
  spindleNose: 'locked',
};

export const BORE_GRINDER: GrinderData = {
  motorNoLoadRpm: 2850,
  motorPowerW: 370,
  spindleMaximumRpm: 24_000,
  beltSteps: [
    {
      id: 'a',
      name: 'A',
      drivingPulleyMm: 90,
      drivenPulleyMm: 30,
      beltThicknessMm: 2,
      measured: null,
    },
    {
      id: 'b',
      name: 'B',
      drivingPulleyMm: 120,
      drivenPulleyMm: 22,
      beltThicknessMm: 2,
      measured: null,
    },
    {
      id: 'c',
      name: 'C',
      drivingPulleyMm: 150,
      drivenPulleyMm: 20,
      beltThicknessMm: 2,
      measured: null,
    },
  ],
  guard: 'none',
  postStiffnessNPerMm: 6000,
  wheelRotation: 'clockwise',
  shimsMm: [0.1, 0.5, 1],
};

export const SHAFT_GRINDER: GrinderData = {
  motorNoLoadRpm: 2850,
  motorPowerW: 750,
  spindleMaximumRpm: 7000,
  beltSteps: [
    {
      id: 'a',
      name: '1',
      drivingPulleyMm: 80,
      drivenPulleyMm: 80,
      beltThicknessMm: 2.5,
      measured: null,
    },
    {
      id: 'b',
      name: '2',
      drivingPulleyMm: 100,
      drivenPulleyMm: 72,
      beltThicknessMm: 2.5,
      measured: null,
    },
    {
      id: 'c',
      name: '3',
      drivingPulleyMm: 120,
      drivenPulleyMm: 60,
      beltThicknessMm: 2.5,
      measured: null,
    },
  ],
  guard: 'fixed',
  postStiffnessNPerMm: 6000,
  wheelRotation: 'anticlockwise',
  shimsMm: [],
};

export const QUILL: QuillData = {
  segments: [{ lengthMm: 60, diameterMm: 16 }],
  material: 'steel',
  markedMaximumRpm: 24_000,
  seatDiameterMm: 8,
  threadHand: 'right',
  measuredStiffnessNPerMm: null,
  measuredFrequencyHz: null,
};

export const ARBOR: QuillData = {
  segments: [{ lengthMm: 40, diameterMm: 25 }],
  material: 'steel',
  markedMaximumRpm: null,
  seatDiameterMm: 20,
  threadHand: 'left',
  measuredStiffnessNPerMm: null,
  measuredFrequencyHz: null,
};

export const SMALL_WHEEL: WheelData = {
  marking: 'A 60 K 7 V',
  diameterNewMm: 28,
  diameterNowMm: 27,
  widthMm: 12,
  holeMm: 8,
  markedRpm: 22_000,
  markedSpeedMPerS: null,
  markingReadOn: 'box',
  mounted: null,
  smallestUsableMm: null,
  looked: 'sound',
  rung: 'clear',
  expiresOn: null,
  state: 'on the rack',
  setAsideReason: null,
  unsigned: false,
};

export const LARGE_WHEEL: WheelData = {
  ...SMALL_WHEEL,
  diameterNewMm: 125,
  diameterNowMm: 120,
  widthMm: 16,
  holeMm: 20,
  markedRpm: null,
  markedSpeedMPerS: 35,
  markingReadOn: 'blotter',
};
