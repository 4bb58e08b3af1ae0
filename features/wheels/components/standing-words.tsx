import { VerdictIcon } from '@/features/ui/icon';
import { Body, Strong } from '@/features/ui/text';

import type { Standing } from '../standing';

/** Where a wheel stands, in word and, where it must not run, in shape. */
export function StandingWords({ usable, words }: Standing) {
  if (usable) return <Body>{words}</Body>;
  return (
    <Strong tone="stop">
      <VerdictIcon verdict="stop" size={18} />
      {` ${words}`}
    </Strong>
  );
}
