/**
 * The ranges a field may hold, in the unit its key names. Beyond them a value is a slip of the finger,
 * not a bold choice: forms and contracts both read them here. Wise and unwise values inside the range
 * are the rules' business.
 */
export interface Range {
  min: number;
  max: number;
}

export const LIMITS = {
  // Work
  diameterMm: { min: 1, max: 2000 },
  lengthMm: { min: 0.5, max: 5000 },
  stockOnDiameterMm: { min: 0.001, max: 10 },
  toleranceMm: { min: 0.0001, max: 5 },
  runOutMm: { min: 0, max: 10 },
  readingMm: { min: -50, max: 50 },
  unsupportedLengthMm: { min: 0.5, max: 10000 },
  clearDepthMm: { min: 0, max: 5000 },
  jawCount: { min: 2, max: 12 },
  padWidthMm: { min: 0.5, max: 500 },
  distanceMm: { min: 0, max: 5000 },
  highSpotDeg: { min: -360, max: 360 },
  bellMouthMm: { min: 0, max: 5 },
  includedAngleDeg: { min: 0.05, max: 150 },
  smallDiameterMm: { min: 0, max: 2000 },
  taperPerLength: { min: 0.0005, max: 7 },
  warmerK: { min: 0, max: 200 },
  // Lathe
  spindleSpeedRpm: { min: 1, max: 10000 },
  feedMmPerRev: { min: 0.001, max: 20 },
  dialDivisionMm: { min: 0.0005, max: 1 },
  dialDivisions: { min: 10, max: 1000 },
  compoundTravelMm: { min: 5, max: 2000 },
  slideMmPerTurn: { min: 0.1, max: 20 },
  // Grinder, quill
  motorRpm: { min: 100, max: 100000 },
  spindleRpm: { min: 1, max: 200000 },
  motorPowerW: { min: 10, max: 50000 },
  pulleyMm: { min: 3, max: 1000 },
  beltThicknessMm: { min: 0, max: 30 },
  stiffnessNPerMm: { min: 1, max: 1000000 },
  quillLengthMm: { min: 1, max: 1000 },
  quillDiameterMm: { min: 0.5, max: 200 },
  frequencyHz: { min: 1, max: 20000 },
  belowCentreMm: { min: -50, max: 50 },
  shimMm: { min: 0.005, max: 50 },
  // Wheel
  wheelDiameterMm: { min: 2, max: 1000 },
  wheelWidthMm: { min: 0.5, max: 300 },
  wheelHoleMm: { min: 0, max: 500 },
  wheelRpm: { min: 1, max: 300000 },
  wheelSpeedMPerS: { min: 1, max: 200 },
  // Cut, dress
  infeedMm: { min: 0.0001, max: 0.5 },
  traverseMmPerRev: { min: 0.001, max: 200 },
  finishStockMm: { min: 0.001, max: 1 },
  sparkOutPasses: { min: 0, max: 12 },
  overrunMm: { min: 0, max: 300 },
  softnessPerMm: { min: 0.01, max: 100000 },
  gaugeStepMm: { min: 0.0001, max: 0.1 },
  tipRadiusMm: { min: 0.01, max: 5 },
  diamondCarats: { min: 0.05, max: 10 },
  dressDepthMm: { min: 0.001, max: 0.2 },
  dressPasses: { min: 1, max: 50 },
  dressOverlap: { min: 1, max: 30 },
  // Rack
  trialRunMinutes: { min: 0.5, max: 60 },
  usedMinutes: { min: 1, max: 1440 },
} as const satisfies Record<string, Range>;

export type LimitName = keyof typeof LIMITS;

/** Longest texts, in characters. */
export const TEXT_LIMITS = {
  name: 80,
  email: 254,
  note: 2000,
  marking: 40,
  tag: 20,
  place: 40,
  wheelClass: 120,
  typed: 40,
  passwordMin: 15,
  passwordMax: 128,
} as const;
