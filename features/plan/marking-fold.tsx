import { Stack } from '@/features/ui/card';
import { Fold } from '@/features/ui/fold';
import { List, ListRow } from '@/features/ui/list-row';
import { Body, Small, Strong } from '@/features/ui/text';
import { explainMarking } from '@/shared/rules/marking-words';

import { sourceWords } from './figure-text';
import { MARKING_PART_WORDS, readMarking, type MarkingReading } from './marking-reading';

interface MarkingFoldProps {
  /** The mark as it stands on the wheel; null where nothing is legible. */
  marking: string | null;
  startOpen?: boolean;
}

/** What each position of a wheel's mark means; while it does not read, where it stops and what belongs there. */
export function MarkingFold({ marking, startOpen = false }: MarkingFoldProps) {
  const reading = readMarking(marking ?? '');
  return (
    <Fold label="What the marking says" value={shortWords(reading)} startOpen={startOpen}>
      <Stack gap={3}>
        {reading === null ? (
          <Body>
            Five positions, in this order: abrasive, grain, grade, structure where it is given,
            bond. For diamond and cBN the concentration takes the place of the structure.
          </Body>
        ) : reading.parsed.ok ? (
          <List label="Positions of the marking">
            {explainMarking(reading.parsed.marking).map(({ part, mark, means }) => (
              <ListRow
                key={part}
                label={MARKING_PART_WORDS[part]}
                detail={means}
                aside={<Strong>{mark}</Strong>}
              />
            ))}
          </List>
        ) : (
          <Body>{reading.fault ?? reading.next}</Body>
        )}
        <Small>{markingSource()}</Small>
      </Stack>
    </Fold>
  );
}

function shortWords(reading: MarkingReading | null): string {
  if (reading === null) return 'nothing legible';
  if (reading.written !== null) return reading.written;
  return reading.parsed.ok
    ? ''
    : `${MARKING_PART_WORDS[reading.parsed.part].toLowerCase()} not read`;
}

function markingSource(): string {
  const { title, place, mark } = sourceWords('iso-525');
  return `${[title, place].filter(Boolean).join(', ')}. ${mark}.`;
}
