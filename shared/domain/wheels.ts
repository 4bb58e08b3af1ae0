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

/** A wheel's head on its own mandrel: the maker's figure for this overhang is the one that counts. */
export interface MountedWheel {
  mandrelDiameterMm: number;
  overhangMm: number;
  threaded: boolean;
  makerMaximumRpm: number | null;
}

export interface WheelData {
  /** As marked, for example "A 60 K 7 V"; null when nothing is legible. */
  marking: string | null;
  diameterNewMm: number;
  diameterNowMm: number;
  widthMm: number;
  holeMm: number;
  markedRpm: number | null;
  markedSpeedMPerS: number | null;
  markingReadOn: MarkingPlace | null;
  mounted: MountedWheel | null;
  looked: LookResult | null;
  rung: RingResult | null;
  /** ISO date after which the wheel must not run; null when none is set. */
  expiresOn: string | null;
  state: WheelState;
  /** Why the wheel was set aside; null otherwise. */
  setAsideReason: string | null;
}
