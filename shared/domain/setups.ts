import type { Rotation, LatheData, GrinderData, QuillData } from './machines';
import type { Material } from './materials';
import type { ShopRules } from './shop-rules';
import type { WheelData } from './wheels';

export const OPERATIONS = ['jaws', 'bore', 'outside', 'taper'] as const;
export type Operation = (typeof OPERATIONS)[number];

export const SETUP_PARTS = ['work', 'machine', 'wheel', 'cut', 'dress'] as const;
export type SetupPart = (typeof SETUP_PARTS)[number];

export const SETUP_STATES = ['draft', 'for review', 'cleared', 'retired'] as const;
export type SetupState = (typeof SETUP_STATES)[number];

export const VERDICTS = ['incomplete', 'clear', 'check', 'stop'] as const;
export type Verdict = (typeof VERDICTS)[number];

export const HOLDINGS = [
  'chuck',
  'spindle taper',
  'chuck and centre',
  'centres',
  'chuck and steady',
] as const;
export type Holding = (typeof HOLDINGS)[number];

export const PRELOADS = ['ring', 'plug', 'spider'] as const;
export type Preload = (typeof PRELOADS)[number];

export const SIDES = ['outside', 'inside'] as const;
export type Side = (typeof SIDES)[number];

/** What makes the taper: the compound slide set over, or the tailstock, between centres only. */
export const TAPER_METHODS = ['compound', 'tailstock'] as const;
export type TaperMethod = (typeof TAPER_METHODS)[number];

/** What the drawing gives besides diameter and length. */
export const TAPER_GIVEN = ['angle', 'small end', 'taper'] as const;
export type TaperGiven = (typeof TAPER_GIVEN)[number];

/** Ends of the surface at which a shoulder stops the wheel. */
export const SHOULDERS = ['none', 'one end', 'both ends'] as const;
export type Shoulders = (typeof SHOULDERS)[number];

export const PASS_STROKES = ['one stroke', 'both strokes'] as const;
export type PassStrokes = (typeof PASS_STROKES)[number];

/** Null is "not answered yet" in every field below. Each operation reads its own fields. */
export interface WorkInputs {
  material: Material | null;
  /** Before grinding; of a taper at its big end. */
  diameterMm: number | null;
  /** Length of the ground surface along the axis; for jaws the length of the pads. */
  lengthMm: number | null;
  /** Metal to remove, on diameter (outside, bore). */
  stockOnDiameterMm: number | null;
  /** Permitted error of size, on diameter. */
  toleranceMm: number | null;
  /** Worst run-out over the length, TIR (outside, bore). */
  runOutMm: number | null;
  /** Tapers: a cone on a shaft or centre, or in a bore. */
  taperSide: Side;
  taperMethod: TaperMethod;
  taperGiven: TaperGiven;
  includedAngleDeg: number | null;
  smallDiameterMm: number | null;
  /** Change of diameter over length along the axis. */
  taperPerLength: number | null;
  shoulders: Shoulders;
  /** How much warmer than gauge and room the work is when it is measured, kelvin. */
  warmerK: number | null;
  /** Between centres, after a trial cut: diameters near both ends, and how far apart they were taken. */
  headEndMm: number | null;
  tailEndMm: number | null;
  endsApartMm: number | null;
  /** Keyways, splines, holes: the wheel leaves and meets the work again. */
  interrupted: boolean;
  holding: Holding | null;
  /** From chuck face to the far end of the ground surface, or between the centres. */
  unsupportedLengthMm: number | null;
  /** Smallest diameter of the work between its supports; null uses the ground diameter. */
  shaftDiameterMm: number | null;
  /** Bore: does the wheel come out at the far end? */
  throughBore: boolean | null;
  /** Bores and jaws: free depth beyond the ground surface for the wheel and its nut. */
  clearDepthMm: number | null;
  /** Jaws: how many. */
  jawCount: number | null;
  /** Jaws: diameter at which the pads close on the preload and will be ground. */
  jawBoreMm: number | null;
  /** Jaws: width across one pad. */
  padWidthMm: number | null;
  /** Jaws: diameter at which the pads were last ground; null when not known. */
  lastGroundDiameterMm: number | null;
  preload: Preload | null;
  /** Jaws: distance from the chuck face of the nearer plane, its run-out (TIR) and high spot from jaw 1. */
  nearDistanceMm: number | null;
  nearRunOutMm: number | null;
  nearHighSpotDeg: number | null;
  farDistanceMm: number | null;
  farRunOutMm: number | null;
  farHighSpotDeg: number | null;
  /** Jaws: what the pads are worn back at the front, on radius; null when not measured. */
  bellMouthMm: number | null;
}

export interface MachineInputs {
  latheId: string | null;
  grinderId: string | null;
  quillId: string | null;
  beltStepId: string | null;
  /** A fixed shield stands around the open wheel, signed for before starting. */
  shieldFitted: boolean;
  /** How far the wheel's axis stands below the height of centres; negative above. Null: not looked at. */
  belowCentreMm: number | null;
  /** Which way the work turns; null takes the way the rule asks for. */
  workRotation: Rotation | null;
}

export interface WheelInputs {
  /** From the Rack; null when typed in. */
  wheelId: string | null;
  /** A wheel typed in for this setup alone; null when one from the Rack is used. */
  typed: TypedWheel | null;
}

/** The fields of a wheel that is typed in; mounted wheels come from the Rack, with their maker's figures. */
export type TypedWheel = Nullable<
  Pick<
    WheelData,
    | 'marking'
    | 'diameterNewMm'
    | 'diameterNowMm'
    | 'widthMm'
    | 'holeMm'
    | 'markedRpm'
    | 'markedSpeedMPerS'
    | 'markingReadOn'
    | 'looked'
    | 'rung'
  >
>;

type Nullable<T> = { [K in keyof T]: T[K] | null };

/** Null takes the suggested value. */
export interface CutInputs {
  latheRpm: number | null;
  roughInfeedMm: number | null;
  finishInfeedMm: number | null;
  roughTraverseMmPerRev: number | null;
  finishTraverseMmPerRev: number | null;
  finishStockMm: number | null;
  sparkOutPasses: number | null;
  overrunMm: number | null;
  /** Learned from spark-out in earlier runs, for this quill, kind of wheel and material; null computes it. */
  softnessPerMm: number | null;
  strokes: PassStrokes | null;
}

/** Null takes the suggested value. */
export interface DressInputs {
  tipRadiusMm: number | null;
  diamondCarats: number | null;
  roughDepthMm: number | null;
  roughPasses: number | null;
  roughOverlap: number | null;
  finishDepthMm: number | null;
  finishPasses: number | null;
  finishOverlap: number | null;
}

/** What a setup stores: SI numbers, and beside them the text as it was typed. */
export interface SetupInputs {
  operation: Operation;
  work: WorkInputs;
  machine: MachineInputs;
  wheel: WheelInputs;
  cut: CutInputs;
  dress: DressInputs;
}

/** SetupInputs with the machines and the wheel they name filled in: all that the rules read. */
export interface PlanInput extends SetupInputs {
  lathe: LatheData | null;
  grinder: GrinderData | null;
  quill: QuillData | null;
  /** The wheel from the Rack, or the typed one once its diameter, width and hole are known. */
  wheelData: WheelData | null;
  rules: ShopRules;
  /** The shop's own date, ISO; expiry is judged against it. */
  today: string;
}
