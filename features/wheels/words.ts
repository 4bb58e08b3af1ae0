import type { DueReason, EntryKind } from '@/shared/domain/wheel-life';
import {
  SHAPE_WORDS,
  type LookResult,
  type MarkingPlace,
  type RingResult,
  type WheelShape,
  type WheelState,
} from '@/shared/domain/wheels';

export const LOOK_WORDS: Record<LookResult, string> = {
  sound: 'Looked at, no fault seen',
  damaged: 'Damaged',
};

export const RING_WORDS: Record<RingResult, string> = {
  clear: 'Rings clear',
  dull: 'Dull',
  silent: 'Does not ring',
};

export const MARKING_PLACE_WORDS: Record<MarkingPlace, string> = {
  wheel: 'on the wheel',
  blotter: 'on the blotter',
  box: 'on the box',
  tag: 'on a tag',
};

export const STATE_WORDS: Record<WheelState, string> = {
  'on the rack': 'On the rack',
  mounted: 'Mounted',
  'set aside': 'Set aside',
  scrapped: 'Scrapped',
};

/** "1, straight" */
export const shapeWords = (shape: WheelShape) => `${shape}, ${SHAPE_WORDS[shape]}`;

export const DUE_WORDS: Record<DueReason, string> = {
  'close look': 'Close look',
  'ring test': 'Ring test',
  expiry: 'Expires',
};

/** A step as somebody takes it: the words on its button and over its form. */
export const STEP_LABELS: Record<EntryKind, string> = {
  received: 'Receive',
  inspected: 'Close look',
  'ring test': 'Ring test',
  mounted: 'Mount',
  'trial run': 'Trial run',
  dressed: 'Dress',
  used: 'Used',
  'taken off': 'Take off',
  'set aside': 'Set aside',
  returned: 'Return to the rack',
  scrapped: 'Scrap',
  countersigned: 'Sign',
  correction: 'Correct',
};
