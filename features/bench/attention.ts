import { standingOf } from '@/features/wheels';
import type { SetupSummary } from '@/shared/contracts/setups';
import type { Wheel } from '@/shared/contracts/wheels';
import type { Verdict } from '@/shared/domain/setups';

/** The gravest first; a clear setup asks for nothing. */
const ORDER: readonly Verdict[] = ['stop', 'incomplete', 'check'];

/** The drafts that ask for something: one's own before those of others, the gravest first. */
export function needingAttention(setups: readonly SetupSummary[], person: string): SetupSummary[] {
  const rank = ({ verdict, updatedByName }: SetupSummary) =>
    ORDER.indexOf(verdict) + (updatedByName === person ? 0 : ORDER.length);
  return setups
    .filter(({ state, verdict }) => state !== 'retired' && ORDER.includes(verdict))
    .sort((a, b) => rank(a) - rank(b));
}

/** What else was edited lately. */
export function recentlyEdited(
  setups: readonly SetupSummary[],
  shown: readonly SetupSummary[],
): SetupSummary[] {
  const ids = new Set(shown.map(({ id }) => id));
  return setups.filter(({ id, state }) => state !== 'retired' && !ids.has(id));
}

export interface WheelOut {
  wheel: Wheel;
  standing: ReturnType<typeof standingOf>;
}

/** Wheels that must not run and are not scrapped, with the reason; `today` is the shop's date. */
export function wheelsOut(wheels: readonly Wheel[], today: string): WheelOut[] {
  return wheels
    .filter(({ data }) => data.state !== 'scrapped')
    .map((wheel) => ({ wheel, standing: standingOf(wheel.data, today) }))
    .filter(({ standing }) => !standing.usable);
}
