import type { CompoundZero } from '../domain/machines';
import type { SetupPart, TaperMethod, Verdict } from '../domain/setups';
import type { UnitName } from '../units/unit';
import type { CautionId } from './cautions';
import type { FindingCode } from './findings';
import type { SourceId } from './sources';

/** A value in the unit it is computed in; people read it in theirs. */
export interface Quantity {
  value: number;
  unit: UnitName;
}

/** One symbol of a formula, with what stood in it. */
export interface Term {
  symbol: string;
  meaning: string;
  value: number | null;
  unit: UnitName;
  /** True for a value nobody gave: assumed, or recalled from memory and kept as a shop setting. */
  assumed?: boolean;
}

/**
 * How a figure was found. Symbols in the formula stand in braces, `{N} = 60 000 {v} / (π {D})`, so that
 * the values can be set in their place.
 */
export interface Working {
  formula: string;
  terms: Term[];
  source: SourceId;
  /** A plain sentence the formula cannot say. */
  note?: string;
}

export interface Figure {
  /** Null while something it needs is missing. */
  value: number | null;
  unit: UnitName;
  working: Working;
  /** The least and greatest value that the range of an input gives, where that matters. */
  band?: { low: number; high: number };
}

/** Something known about a plan that the reader must weigh. Its words are in findings.ts, under its code. */
export interface Finding {
  code: FindingCode;
  level: 'stop' | 'check' | 'note';
  part: SetupPart;
  figures: Record<string, Quantity>;
  /** Names set in the words: a step, a tag, a reason. */
  names: Record<string, string>;
  source: SourceId;
}

/** A missing input: the part it stands in, the path of its field, and its name in words. */
export interface Need {
  part: SetupPart;
  field: string;
  label: string;
}

export interface SpeedLimit {
  kind:
    | 'marked rpm'
    | 'marked speed'
    | 'unmarked'
    | 'maker, mounted'
    | 'quill marked'
    | 'quill bending'
    | 'grinder spindle';
  rpm: Figure;
}

export interface BeltStepPlan {
  id: string;
  name: string;
  /** The rpm held against the limits: the worst possible, or measured if higher. */
  rpm: Figure;
  /** The rpm to expect with belt thickness. */
  expectedRpm: Figure;
  wheelSpeed: Figure;
  /** Null while no limit is known. */
  allowed: boolean | null;
  actsSoft: boolean;
}

export interface LatheStep {
  rpm: number;
  workSpeedMPerMin: number;
  speedRatio: number | null;
}

export const PASS_STAGES = ['rough', 'rough spark-out', 'finish', 'finish spark-out'] as const;
export type PassStage = (typeof PASS_STAGES)[number];

export interface Pass {
  number: number;
  stage: PassStage;
  /** On radius, as set at the cross-slide; 0 for spark-out. */
  infeedMm: number;
  /** Divisions of the cross-slide dial, halved already where it reads diameter; null without a dial. */
  divisions: number | null;
  cutMm: number;
  springMm: number;
  dialToGoMm: number;
  metalToGoMm: number;
}

export interface JawContact {
  jaw: number;
  /** Infeed on radius after first contact at which the jaw starts to touch, and is clean to the back. */
  touchesAtMm: number;
  cleanAtMm: number;
  /** 1 is first. */
  order: number;
  angleDeg: number;
}

export interface JawPlan {
  contacts: JawContact[];
  /** Across the outermost path of the wheel when the first pad is touched. */
  firstContactDiameterMm: number;
  /** Infeed from first contact until every pad is clean, on radius. */
  cleanUp: Figure;
  eccentricityMm: number;
  highSpotDeg: number;
  tilt: Figure;
}

export interface DressStage {
  passes: number;
  depth: Figure;
  lead: Figure;
  traverseRate: Figure;
  secondsAcross: Figure;
  wheelLoss: Figure;
  overlap: number;
}

/** How the slides are set for a taper. */
export interface TaperPlan {
  method: TaperMethod;
  /** Between the cone's side and the spindle axis. */
  halfAngle: Figure;
  includedAngle: Figure;
  /** Change of diameter over length. */
  perLength: Figure;
  smallDiameter: Figure;
  slantLength: Figure;
  /** Depth of cut, square to the surface, for each unit of infeed at the cross-slide. */
  depthPerInfeed: Figure;
  /** Null where the tailstock is set over. */
  compound: {
    /** How this lathe marks its scale; null while nobody has looked. */
    zero: CompoundZero | null;
    /** What the scale reads where its zero lies across the bed, and where it lies along it. */
    fromCrossSlide: Figure;
    fromSpindleAxis: Figure;
    travel: Figure;
    /** Turns of the crank in a second. */
    crankRate: Figure;
    /** The work speed at which one turn a second keeps the planned traverse. */
    handFedSpeed: Figure;
  } | null;
  /** Null where the compound slide is set over. */
  setover: Figure | null;
}

/** What the height of the wheel does, where it was measured. */
export interface HeightPlan {
  /** Share of the infeed that reaches the work. */
  gain: Figure;
  across: Figure;
  /** Shims that raise the wheel to centre, thickest first; null where none do, or none are needed. */
  shimsMm: number[] | null;
}

export interface Plan {
  rulesVersion: string;
  verdict: Verdict;
  needs: Need[];
  findings: Finding[];
  cautions: CautionId[];
  speed: {
    steps: BeltStepPlan[];
    /** The chosen step's id, also when it is too fast. */
    chosen: string | null;
    /** The fastest step that breaks no limit. */
    suggested: string | null;
    spindleRpm: Figure;
    wheelSpeed: Figure;
    speedRatio: Figure;
  };
  limits: { governing: SpeedLimit | null; all: SpeedLimit[] };
  work: {
    targetSpeed: Figure;
    latheRpm: Figure;
    workSpeed: Figure;
    steps: LatheStep[];
    rotation: { work: 'clockwise' | 'anticlockwise' | null; note: string };
  };
  traverse: {
    rough: Figure;
    finish: Figure;
    roughRate: Figure;
    finishRate: Figure;
    overrun: Figure;
    travel: Figure;
    secondsPerStroke: Figure;
    plunge: boolean;
  };
  infeed: {
    rough: Figure;
    finish: Figure;
    /** Where the wheel plunges: infeed for each turn of the work. */
    perTurn: { rough: Figure; finish: Figure } | null;
    roughDivisions: number | null;
    finishDivisions: number | null;
    /** Which cap set the rough infeed. */
    governedBy: 'table' | 'lag' | 'power' | 'burn' | 'dial' | 'shop' | 'stock' | 'typed' | null;
    /** Where the dial is too coarse: the compound's angle that makes one of its divisions fine enough. */
    compoundAngle: Figure | null;
    /** What the wheel wears back on radius in one rough pass: fed extra, apart from the schedule. */
    wheelWear: Figure;
  };
  /** Metal to remove on radius. */
  stock: Figure;
  jaws: JawPlan | null;
  taper: TaperPlan | null;
  height: HeightPlan | null;
  measuring: {
    /** How much the warm work still shrinks on diameter. */
    shrinkage: Figure;
    /** How far to move the tailstock, towards the wheel where positive, when the ends came out unlike. */
    tailstockMove: Figure;
  };
  passes: Pass[];
  cutFraction: { rough: Figure; finish: Figure };
  dressing: { rough: DressStage; finish: DressStage; diamond: Figure } | null;
  quill: {
    stiffness: Figure;
    stiffnessAtWheel: Figure;
    lag: Figure;
    firstFrequency: Figure;
    taper: Figure;
  };
  power: {
    removalRate: Figure;
    tangentialForce: Figure;
    normalForce: Figure;
    power: Figure;
    burnThreshold: Figure;
    chipThickness: Figure;
    specificRemoval: Figure;
  };
  time: { grinding: Figure; dressing: Figure; total: Figure };
}
