import type { WheelData } from '../../domain/wheels';

/** A sound wheel on the rack; a case names what of it matters. */
export const PLAIN_WHEEL: WheelData = {
  marking: 'A 60 K 8 V',
  diameterNewMm: 150,
  diameterNowMm: 150,
  widthMm: 20,
  holeMm: 20,
  markedRpm: 4456,
  markedSpeedMPerS: null,
  markingReadOn: 'wheel',
  mounted: null,
  smallestUsableMm: null,
  looked: 'sound',
  rung: 'clear',
  expiresOn: null,
  state: 'on the rack',
  setAsideReason: null,
  unsigned: false,
};
