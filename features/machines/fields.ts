import type { QuantitySpec } from '@/features/forms';
import type { ListSpec } from '@/features/records';

export const LATHE_LISTS = {
  spindleSpeedsRpm: { label: 'Spindle speeds', unit: 'rpm', limit: 'spindleSpeedRpm' },
  feedsMmPerRev: { label: 'Feeds', unit: 'mm/rev', limit: 'feedMmPerRev' },
} as const satisfies Record<string, QuantitySpec>;

export const LATHE_FIELDS = {
  crossSlideDivisionMm: {
    label: 'One division of the cross-slide',
    hint: 'As marked on the dial.',
    unit: 'mm',
    limit: 'dialDivisionMm',
  },
  crossSlideDivisionsPerTurn: {
    label: 'Divisions in one turn',
    hint: 'Leave empty when not counted.',
    unit: '1',
    limit: 'dialDivisions',
    whole: true,
  },
  compoundDivisionMm: {
    label: 'One division of the compound',
    hint: 'Leave empty without a compound slide.',
    unit: 'mm',
    limit: 'dialDivisionMm',
  },
  compoundTravelMm: {
    label: 'Travel of the compound',
    hint: 'Leave empty when not measured.',
    unit: 'mm',
    limit: 'compoundTravelMm',
  },
  compoundMmPerTurn: {
    label: 'One turn of its crank',
    hint: 'How far the compound moves. Leave empty when not measured.',
    unit: 'mm',
    limit: 'slideMmPerTurn',
  },
} as const satisfies Record<string, QuantitySpec>;

export const GRINDER_LISTS = {
  shimsMm: {
    label: 'Shims kept with it',
    hint: 'The thickness of each piece, also of those alike. Leave empty without shims.',
    unit: 'mm',
    limit: 'shimMm',
    optional: true,
    repeats: true,
  },
} as const satisfies Record<string, ListSpec>;

export const GRINDER_FIELDS = {
  motorNoLoadRpm: {
    label: 'Motor, no load',
    hint: 'The highest it turns: without load, at full voltage.',
    unit: 'rpm',
    limit: 'motorRpm',
  },
  motorPowerW: {
    label: 'Motor power',
    hint: 'From its plate.',
    unit: 'W',
    limit: 'motorPowerW',
  },
  spindleMaximumRpm: {
    label: "Maker's maximum for the spindle",
    hint: 'Leave empty when it is not stated.',
    unit: 'rpm',
    limit: 'spindleRpm',
  },
  postStiffnessNPerMm: {
    label: 'Stiffness of post and slides',
    hint: "Pull at the wheel with a spring balance: force over movement. Empty takes the shop's assumed value.",
    unit: 'N/mm',
    limit: 'stiffnessNPerMm',
  },
} as const satisfies Record<string, QuantitySpec>;

export const STEP_FIELDS = {
  drivingPulleyMm: { label: 'Pulley on the motor', unit: 'mm', limit: 'pulleyMm' },
  drivenPulleyMm: { label: 'Pulley on the spindle', unit: 'mm', limit: 'pulleyMm' },
  beltThicknessMm: {
    label: 'Belt thickness',
    hint: '0 where the pulleys are given by pitch diameter.',
    unit: 'mm',
    limit: 'beltThicknessMm',
  },
} as const satisfies Record<string, QuantitySpec>;

export const MEASURED_FIELDS = {
  rpm: {
    label: 'Measured rpm',
    hint: 'Without load. Counts where it is higher than the pulleys give.',
    unit: 'rpm',
    limit: 'spindleRpm',
  },
} as const satisfies Record<string, QuantitySpec>;

export const QUILL_FIELDS = {
  seatDiameterMm: {
    label: 'Seat',
    hint: "What the wheel's hole slides onto; for mounted wheels the collet's bore.",
    unit: 'mm',
    limit: 'quillDiameterMm',
  },
  markedMaximumRpm: {
    label: 'Marked maximum',
    hint: 'Leave empty where nothing is marked.',
    unit: 'rpm',
    limit: 'spindleRpm',
  },
  measuredStiffnessNPerMm: {
    label: 'Measured stiffness at the wheel end',
    hint: 'Leave empty to have it computed from the sections.',
    unit: 'N/mm',
    limit: 'stiffnessNPerMm',
  },
  measuredFrequencyHz: {
    label: 'Measured bending frequency',
    hint: 'Tapped, with the wheel on. Leave empty to have it computed.',
    unit: 'Hz',
    limit: 'frequencyHz',
  },
} as const satisfies Record<string, QuantitySpec>;

export const SEGMENT_FIELDS = {
  lengthMm: { label: 'Length', unit: 'mm', limit: 'quillLengthMm' },
  diameterMm: { label: 'Diameter', unit: 'mm', limit: 'quillDiameterMm' },
} as const satisfies Record<string, QuantitySpec>;

export type LatheList = keyof typeof LATHE_LISTS;
export type LatheField = keyof typeof LATHE_FIELDS;
export type GrinderField = keyof typeof GRINDER_FIELDS;
export type StepField = keyof typeof STEP_FIELDS;
export type MeasuredField = keyof typeof MEASURED_FIELDS;
export type QuillField = keyof typeof QUILL_FIELDS;
export type SegmentField = keyof typeof SEGMENT_FIELDS;
