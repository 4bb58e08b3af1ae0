import type { SetupSummary } from '@/shared/contracts/setups';

/** How many of a wheel's setups read Stop; retired ones are no longer run and are not counted. */
export function stoppedWords(setups: readonly SetupSummary[]): string {
  const inUse = setups.filter(({ state }) => state !== 'retired');
  const stopped = inUse.filter(({ verdict }) => verdict === 'stop').length;
  if (inUse.length === 0) return 'No setup uses it.';
  if (inUse.length === 1)
    return stopped === 1 ? 'The one setup that uses it is stopped.' : 'One setup uses it.';
  if (stopped === inUse.length) return `All ${stopped} setups that use it are stopped.`;
  return `${stopped} of the ${inUse.length} setups that use it are stopped.`;
}
