/**
 * Lathes and tool-post grinders as a shop records them.
 * Directions of turning are as seen from the tailstock, looking at the headstock.
 */
export const ROTATIONS = ['clockwise', 'anticlockwise'] as const;
export type Rotation = (typeof ROTATIONS)[number];

export const DIAL_READINGS = ['radius', 'diameter'] as const;
export type DialReading = (typeof DIAL_READINGS)[number];

/** Along what the compound slide travels when its scale reads zero. */
export const COMPOUND_ZEROS = ['cross-slide', 'spindle-axis'] as const;
export type CompoundZero = (typeof COMPOUND_ZEROS)[number];

export const SPINDLE_NOSES = ['threaded', 'locked'] as const;
export type SpindleNose = (typeof SPINDLE_NOSES)[number];

export interface LatheData {
  spindleSpeedsRpm: number[];
  feedsMmPerRev: number[];
  /** What one division of the cross-slide dial is marked as, in mm. */
  crossSlideDivisionMm: number;
  crossSlideReads: DialReading;
  /** Divisions in one turn of the dial; null when not recorded. */
  crossSlideDivisionsPerTurn: number | null;
  compoundZero: CompoundZero | null;
  compoundDivisionMm: number | null;
  compoundTravelMm: number | null;
  /** What one turn of the compound's crank moves it. */
  compoundMmPerTurn: number | null;
  /** Null means nobody has looked yet. */
  spindleNose: SpindleNose | null;
}

export interface MeasuredSpeed {
  rpm: number;
  /** ISO date. */
  measuredOn: string;
  instrument: string;
}

export interface BeltStep {
  id: string;
  /** As marked on the machine: a letter or a number. */
  name: string;
  drivingPulleyMm: number;
  drivenPulleyMm: number;
  /** Zero when the pulley diameters are pitch diameters. */
  beltThicknessMm: number;
  measured: MeasuredSpeed | null;
}

/** A guard leaves at most half of the wheel open. */
export const GUARDS = ['none', 'fixed'] as const;
export type Guard = (typeof GUARDS)[number];

export interface GrinderData {
  motorNoLoadRpm: number;
  motorPowerW: number;
  /** The most the maker allows the grinder's spindle; null when not stated. */
  spindleMaximumRpm: number | null;
  beltSteps: BeltStep[];
  guard: Guard;
  /** Force over movement at the wheel, measured; null uses the shop's assumed value. */
  postStiffnessNPerMm: number | null;
  /** Which way the wheel turns as the grinder stands on the tool post; null means not yet looked at. */
  wheelRotation: Rotation | null;
  /** Thickness of each shim kept for setting this grinder to centre height. */
  shimsMm: number[];
}

export const QUILL_MATERIALS = ['steel', 'carbide'] as const;
export type QuillMaterial = (typeof QUILL_MATERIALS)[number];

export const THREAD_HANDS = ['right', 'left', 'none'] as const;
export type ThreadHand = (typeof THREAD_HANDS)[number];

export interface QuillSegment {
  lengthMm: number;
  diameterMm: number;
}

/** A quill (bores, jaws) or a short arbor (outside work) that carries the wheel. */
export interface QuillData {
  /** From the wheel end to the bearing; one segment for a plain quill. */
  segments: QuillSegment[];
  material: QuillMaterial;
  markedMaximumRpm: number | null;
  /** The seat the wheel's hole slides onto, or the collet's bore for mounted wheels. */
  seatDiameterMm: number;
  /** Hand of the thread of nut or screw; 'none' grips a mandrel. Null means not yet looked at. */
  threadHand: ThreadHand | null;
  measuredStiffnessNPerMm: number | null;
  measuredFrequencyHz: number | null;
}
