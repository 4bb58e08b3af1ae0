import { dayWords } from '@/features/records';
import type { WheelData } from '@/shared/domain/wheels';
import { isOrganic, markingOf } from '@/shared/rules/bond';
import type { FindingCode } from '@/shared/rules/findings';
import { limitRpm, wheelLimits } from '@/shared/rules/limits';
import type { SpeedLimit } from '@/shared/rules/types';
import { wheelFindings } from '@/shared/rules/wheel-checks';

import { STATE_WORDS } from './words';

export interface Standing {
  /** False where something known or missing keeps the wheel from running. */
  usable: boolean;
  /** In a few words, for a row of the rack. */
  words: string;
}

const SHORT: Partial<Record<FindingCode, (wheel: WheelData) => string>> = {
  'wheel-set-aside': ({ setAsideReason }) => `set aside: ${setAsideReason ?? ''}`,
  'wheel-scrapped': () => 'scrapped',
  'wheel-expired': ({ expiresOn }) => `expired ${expiresOn ? dayWords(expiresOn) : ''}`,
  'wheel-damaged': () => 'damaged',
  'ring-dull': () => 'dull ring',
  'ring-silent-large': () => 'does not ring',
  'wheel-worn-out': () => 'worn out',
  'wheel-unsigned': () => 'waits for a signature',
  'unmarked-wheel': () => 'no speed marked',
  'mounted-no-figure': () => "no maker's rpm",
  'wheel-not-looked-at': () => 'close look due',
  'ring-missing': () => 'ring test due',
};

export const wheelFindingsOn = (wheel: WheelData, today: string) =>
  wheelFindings({
    wheel,
    quill: null,
    organicBond: isOrganic(markingOf(wheel.marking)),
    typed: false,
    today,
  });

/** What the rack says of a wheel: the gravest thing against it, else where it is. */
export function standingOf(wheel: WheelData, today: string): Standing {
  const stops = wheelFindingsOn(wheel, today).filter(({ level }) => level === 'stop');
  const order = Object.keys(SHORT);
  const [first] = stops.sort((a, b) => order.indexOf(a.code) - order.indexOf(b.code));
  if (!first) return { usable: true, words: STATE_WORDS[wheel.state].toLowerCase() };
  return { usable: false, words: SHORT[first.code]?.(wheel) ?? 'must not run' };
}

/** The same with the spindle it sits on: where a mounted wheel is, and where one set aside still hangs. */
export function standingOn(wheel: WheelData, today: string, spindle: string | null): Standing {
  const standing = standingOf(wheel, today);
  if (spindle === null) return standing;
  const on = wheel.state === 'mounted' && standing.usable ? ' on ' : ', still on ';
  return { ...standing, words: `${standing.words}${on}${spindle}` };
}

/** The limit that governs the wheel by itself: the lowest of what is marked, rounded down. */
export function governingLimit(
  wheel: Pick<WheelData, 'markedRpm' | 'markedSpeedMPerS' | 'diameterNewMm' | 'mounted'>,
): SpeedLimit | null {
  const [lowest] = wheelLimits(wheel).sort((a, b) => limitRpm(a) - limitRpm(b));
  return lowest ?? null;
}
