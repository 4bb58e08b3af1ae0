import { View } from 'react-native';

import { Fold } from '@/features/ui/fold';
import { Engraved, Small } from '@/features/ui/text';

import type { SourceEntry } from '../ledger';
import { counted } from '../words';
import { Checks } from './checks';
import { RestingWords } from './resting-words';

interface SourceFoldProps {
  entry: SourceEntry;
  startOpen: boolean;
}

/** One source: what rests on it, and each check against it. */
export function SourceFold({ entry, startOpen }: SourceFoldProps) {
  const { source, checks, resting } = entry;
  const { title, place, edition, note } = source;
  const label = [title, edition].filter(Boolean).join(', ');
  return (
    <Fold label={`${label}: ${place}`} value={answerWords(entry)} startOpen={startOpen}>
      {note ? <Small>{note}</Small> : null}
      <View>
        <Engraved>What rests on it</Engraved>
        <RestingWords resting={resting} />
      </View>
      {checks.length > 0 ? (
        <View>
          <Engraved>Checked against it</Engraved>
          <Checks caption={`Checks against ${label}, ${place}`} checks={checks} />
        </View>
      ) : null}
    </Fold>
  );
}

function answerWords({ checks }: SourceEntry): string {
  if (checks.length === 0) return 'no published check';
  const missed = checks.filter(({ ok }) => !ok).length;
  return missed === 0
    ? `${counted(checks.length, 'check')}`
    : `${missed} of ${counted(checks.length, 'check')} differ`;
}
