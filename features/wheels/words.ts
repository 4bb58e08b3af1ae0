import type { LookResult, MarkingPlace, RingResult, WheelState } from '@/shared/domain/wheels';

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
