import type { GrinderData, LatheData, QuillData } from '@/shared/domain/machines';

const MM_PER_INCH = 25.4;
const inches = (values: number[]) => values.map((value) => value * MM_PER_INCH);

interface Named<T> {
  id: string;
  name: string;
  data: T;
}

export const metricLathe: Named<LatheData> = {
  id: '01900000-0000-7000-8000-000000000201',
  name: 'Tarnholt 330, metric',
  data: {
    spindleSpeedsRpm: [32, 48, 70, 105, 155, 230, 340, 500, 740, 1100, 1600],
    feedsMmPerRev: [0.05, 0.06, 0.08, 0.1, 0.12, 0.16, 0.2, 0.25, 0.32, 0.4, 0.5, 0.63, 0.8, 1],
    crossSlideDivisionMm: 0.02,
    crossSlideReads: 'diameter',
    crossSlideDivisionsPerTurn: 200,
    compoundZero: 'cross-slide',
    compoundDivisionMm: 0.02,
    compoundTravelMm: 110,
    compoundMmPerTurn: 2,
    spindleNose: 'locked',
  },
};

export const inchLathe: Named<LatheData> = {
  id: '01900000-0000-7000-8000-000000000202',
  name: 'Penhallow 13 inch',
  data: {
    spindleSpeedsRpm: [45, 70, 105, 160, 240, 360, 540, 800, 1200, 1800],
    feedsMmPerRev: inches([0.0015, 0.002, 0.003, 0.004, 0.0055, 0.008, 0.011, 0.016, 0.022]),
    crossSlideDivisionMm: 0.001 * MM_PER_INCH,
    crossSlideReads: 'diameter',
    crossSlideDivisionsPerTurn: 100,
    compoundZero: 'cross-slide',
    compoundDivisionMm: 0.001 * MM_PER_INCH,
    compoundTravelMm: 4 * MM_PER_INCH,
    compoundMmPerTurn: 0.1 * MM_PER_INCH,
    spindleNose: 'locked',
  },
};

const outsideSteps = [
  ['1', 70, 100],
  ['2', 85, 90],
  ['3', 100, 80],
  ['4', 112, 70],
  ['5', 125, 60],
] as const;

export const outsideGrinder: Named<GrinderData> & { quills: Named<QuillData>[] } = {
  id: '01900000-0000-7000-8000-000000000301',
  name: 'Wexcombe post grinder, outside',
  data: {
    motorNoLoadRpm: 2980,
    motorPowerW: 750,
    spindleMaximumRpm: 7500,
    beltSteps: outsideSteps.map(([name, drivingPulleyMm, drivenPulleyMm], index) => ({
      id: `01900000-0000-7000-8000-00000000031${index + 1}`,
      name,
      drivingPulleyMm,
      drivenPulleyMm,
      beltThicknessMm: 4,
      measured: null,
    })),
    guard: 'fixed',
    postStiffnessNPerMm: 8200,
    wheelRotation: 'clockwise',
    shimsMm: [0.05, 0.1, 0.1, 0.2, 0.5, 1, 1, 2],
  },
  quills: [
    {
      id: '01900000-0000-7000-8000-000000000331',
      name: 'Short arbor, 20 mm seat',
      data: {
        segments: [{ lengthMm: 45, diameterMm: 32 }],
        material: 'steel',
        markedMaximumRpm: 7500,
        seatDiameterMm: 20,
        threadHand: 'right',
        measuredStiffnessNPerMm: null,
        measuredFrequencyHz: null,
      },
    },
  ],
};

const insideSteps = [
  ['A', 140, 40],
  ['B', 160, 32],
  ['C', 175, 28],
  ['D', 190, 22],
] as const;

export const insideGrinder: Named<GrinderData> & { quills: Named<QuillData>[] } = {
  id: '01900000-0000-7000-8000-000000000302',
  name: 'Wexcombe post grinder, inside',
  data: {
    motorNoLoadRpm: 2980,
    motorPowerW: 550,
    spindleMaximumRpm: 26_000,
    beltSteps: insideSteps.map(([name, drivingPulleyMm, drivenPulleyMm], index) => ({
      id: `01900000-0000-7000-8000-00000000032${index + 1}`,
      name,
      drivingPulleyMm,
      drivenPulleyMm,
      beltThicknessMm: 2,
      measured:
        name === 'C'
          ? { rpm: 18_350, measuredOn: '2025-09-18', instrument: 'Optical tachometer T2' }
          : null,
    })),
    guard: 'none',
    postStiffnessNPerMm: 6400,
    wheelRotation: 'clockwise',
    shimsMm: [0.05, 0.1, 0.25, 0.5, 1],
  },
  quills: [
    {
      id: '01900000-0000-7000-8000-000000000341',
      name: 'Stepped quill, 8 mm seat',
      data: {
        segments: [
          { lengthMm: 25, diameterMm: 14 },
          { lengthMm: 45, diameterMm: 20 },
        ],
        material: 'steel',
        markedMaximumRpm: 30_000,
        seatDiameterMm: 8,
        threadHand: 'right',
        measuredStiffnessNPerMm: null,
        measuredFrequencyHz: null,
      },
    },
    {
      id: '01900000-0000-7000-8000-000000000342',
      name: 'Carbide quill, 6 mm seat',
      data: {
        segments: [{ lengthMm: 60, diameterMm: 10 }],
        material: 'carbide',
        markedMaximumRpm: null,
        seatDiameterMm: 6,
        threadHand: 'right',
        measuredStiffnessNPerMm: 3900,
        measuredFrequencyHz: null,
      },
    },
    {
      id: '01900000-0000-7000-8000-000000000343',
      name: 'Collet for mounted wheels, 6 mm',
      data: {
        segments: [{ lengthMm: 50, diameterMm: 18 }],
        material: 'steel',
        markedMaximumRpm: 35_000,
        seatDiameterMm: 6,
        threadHand: 'none',
        measuredStiffnessNPerMm: null,
        measuredFrequencyHz: null,
      },
    },
  ],
};
