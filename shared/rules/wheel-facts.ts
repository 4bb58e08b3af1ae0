import type { Abrasive, RackWheel } from '../domain/wheels';
import { isOrganic, markingOf } from './bond';
import { limitRpm, wheelLimits } from './limits';
import { abrasiveFamily } from './recommended-marks';
import { wheelFindings } from './wheel-checks';

/** Raised when wheels as they stand may come to other facts; stored ones are then worked out anew. */
export const WHEEL_FACTS_VERSION = 1;

/** What a rack is searched by, worked out from what is written down. */
export interface WheelFacts {
  abrasive: Abrasive | null;
  grain: number | null;
  grade: string | null;
  bond: string | null;
  /** The lowest limit that the wheel itself sets, whole rpm; 0 where nothing is marked. */
  limitRpm: number;
  /** Whether it may be mounted or run as it is, up to the date of its expiry. */
  usable: boolean;
}

/** Before every date of expiry. */
const NO_DAY_YET = '0001-01-01';

/**
 * The parts of a wheel's marking, its own speed limit, and whether anything stands against it.
 *
 * @param wheel - the wheel as its record and its entries have it.
 * @returns null for parts of a marking that does not read.
 * @source iso-525
 * @example wheelFacts(rackWheel).abrasive // 'aluminium oxide'
 */
export function wheelFacts(wheel: RackWheel): WheelFacts {
  const marking = markingOf(wheel.marking);
  const findings = wheelFindings({
    wheel,
    quill: null,
    organicBond: isOrganic(marking),
    typed: false,
    today: NO_DAY_YET,
  });
  return {
    abrasive: marking === null ? null : abrasiveFamily(marking),
    grain: marking?.grain ?? null,
    grade: marking?.grade ?? null,
    bond: marking?.bond ?? null,
    limitRpm: Math.min(...wheelLimits(wheel).map(limitRpm)),
    usable: findings.every(({ level }) => level !== 'stop'),
  };
}
