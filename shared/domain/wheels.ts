/** Grinding wheels as the shop's Rack records them. */
export const WHEEL_STATES = ['on the rack', 'mounted', 'set aside', 'scrapped'] as const;
export type WheelState = (typeof WHEEL_STATES)[number];

/** Where the speed marking was read: small wheels carry it off the wheel. */
export const MARKING_PLACES = ['wheel', 'blotter', 'box', 'tag'] as const;
export type MarkingPlace = (typeof MARKING_PLACES)[number];

export const LOOK_RESULTS = ['sound', 'damaged'] as const;
export type LookResult = (typeof LOOK_RESULTS)[number];

/** 'silent' is for wheels too small, or of a bond too soft, to ring. */
export const RING_RESULTS = ['clear', 'dull', 'silent'] as const;
export type RingResult = (typeof RING_RESULTS)[number];

/** Type numbers of ISO 525, from memory; 52 is a wheel on its own mandrel. */
export const WHEEL_SHAPES = [
  ...(['1', '2', '3', '4', '5', '6', '7'] as const),
  ...(['11', '12', '13', '35', '36', '38', '52'] as const),
] as const;
export type WheelShape = (typeof WHEEL_SHAPES)[number];
export const MOUNTED_SHAPE: WheelShape = '52';

export const SHAPE_WORDS: Record<WheelShape, string> = {
  '1': 'straight',
  '2': 'cylinder',
  '3': 'tapered one side',
  '4': 'tapered both sides',
  '5': 'recessed one side',
  '6': 'straight cup',
  '7': 'recessed both sides',
  '11': 'flaring cup',
  '12': 'dish',
  '13': 'saucer',
  '35': 'disc, cemented to a plate',
  '36': 'disc with inserted nuts',
  '38': 'hub on one side',
  '52': 'mounted wheel',
};

export const ABRASIVES = ['aluminium oxide', 'silicon carbide', 'cBN', 'diamond'] as const;
export type Abrasive = (typeof ABRASIVES)[number];

/** A wheel's head on its own mandrel: the maker's figure for this overhang is the one that counts. */
export interface MountedWheel {
  mandrelDiameterMm: number;
  overhangMm: number;
  threaded: boolean;
  makerMaximumRpm: number | null;
}

/** What people write down of a wheel, and may edit. */
export interface WheelRecord {
  /** As marked, for example "A 60 K 7 V"; null when nothing is legible. */
  marking: string | null;
  shape: WheelShape | null;
  diameterNewMm: number;
  widthMm: number;
  holeMm: number;
  markedRpm: number | null;
  markedSpeedMPerS: number | null;
  markingReadOn: MarkingPlace | null;
  mounted: MountedWheel | null;
  /** No dressing goes below it; null leaves only the hole as the end. */
  smallestUsableMm: number | null;
  /** ISO date. */
  madeOn: string | null;
  /** ISO date after which the wheel must not run; null when none is set. */
  expiresOn: string | null;
  /** Where it hangs. */
  place: string | null;
  notes: string | null;
}

/** What the entries of a wheel's life come to; nobody edits it. */
export interface WheelCondition {
  state: WheelState;
  diameterNowMm: number;
  /** Null where nothing counts for the next mounting, or for the running of a mounted wheel. */
  looked: LookResult | null;
  rung: RingResult | null;
  /** Why the wheel was set aside; null otherwise. */
  setAsideReason: string | null;
  /** True while an appointed person's signature is missing for work done on it: then it must not run. */
  unsigned: boolean;
}

/** The part of a wheel that the rules of a plan read. */
export type WheelData = WheelCondition &
  Pick<
    WheelRecord,
    | 'marking'
    | 'diameterNewMm'
    | 'widthMm'
    | 'holeMm'
    | 'markedRpm'
    | 'markedSpeedMPerS'
    | 'markingReadOn'
    | 'mounted'
    | 'smallestUsableMm'
    | 'expiresOn'
  >;

/** A wheel of the Rack, whole. */
export type RackWheel = WheelRecord & WheelCondition;
