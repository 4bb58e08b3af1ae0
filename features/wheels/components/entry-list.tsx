import { useState } from 'react';
import { StyleSheet, View } from 'react-native';

import { dayWords } from '@/features/records';
import { useShop } from '@/features/session';
import { IconButton } from '@/features/ui/button';
import { Stack } from '@/features/ui/card';
import { Sheet } from '@/features/ui/sheet';
import { Body, Heading, Small, Strong } from '@/features/ui/text';
import { colors, space, stroke } from '@/features/ui/tokens';
import type { WheelEntryView, WheelLife } from '@/shared/contracts/wheel-entries';
import { correctionRefusal } from '@/shared/rules/wheel-signatures';
import { stepRefusalWords } from '@/shared/rules/wheel-step-words';
import { formatQuantity } from '@/shared/units/format';

import { entryWords, SIGNER_WORDS, type EntryReader } from '../entry-words';
import { StepSheet } from './step-sheet';

/** Every step of the wheel's life, newest first; what was taken back stands struck through with the reason. */
export function EntryList({ life }: { life: WheelLife }) {
  const { units } = useShop();
  const [asked, setAsked] = useState<WheelEntryView | null>(null);
  const { items } = life.entries;
  const reader = { units, spindles: life.spindles, entries: items };
  const refusal = useCorrectionRefusal(life, asked);
  return (
    <Stack gap={2}>
      <Heading>Its life</Heading>
      <View role="list" aria-label="Its life" style={styles.list}>
        {items.map((entry) => (
          <EntryRow
            key={entry.id}
            entry={entry}
            reader={reader}
            onCorrect={isCorrectable(entry) ? () => setAsked(entry) : undefined}
          />
        ))}
      </View>
      {asked && refusal !== null ? (
        <Sheet open onClose={() => setAsked(null)} title="Not to be corrected" shape="box">
          <Strong>{entryWords(asked.step, reader)}</Strong>
          <Body>{refusal}</Body>
        </Sheet>
      ) : null}
      {asked && refusal === null ? (
        <StepSheet
          key={asked.id}
          life={life}
          kind="correction"
          entryId={asked.id}
          onClose={() => setAsked(null)}
          onRecorded={() => setAsked(null)}
        />
      ) : null}
    </Stack>
  );
}

/** What is on paper alone, or taken back already, has no sign for it. */
const isCorrectable = ({ step, correctedBy }: WheelEntryView) =>
  correctedBy === null && step.kind !== 'correction' && step.kind !== 'countersigned';

/** Why an entry is not to be taken back, as far as the entries fetched tell; the server decides. */
function useCorrectionRefusal(life: WheelLife, entry: WheelEntryView | null): string | null {
  const { units, person, role } = useShop();
  if (entry === null || life.entries.next !== null) return null;
  const entries = life.entries.items.map(({ person: { personId }, ...rest }) => ({
    ...rest,
    personId,
  }));
  const refusal = correctionRefusal(
    { wheel: life.wheel.data, entries, entryId: entry.id },
    { personId: person.personId, role, tasks: [] },
  );
  if (refusal === null) return null;
  return stepRefusalWords(refusal, (quantity) => formatQuantity(quantity, units));
}

interface EntryRowProps {
  entry: WheelEntryView;
  reader: EntryReader;
  onCorrect?: (() => void) | undefined;
}

function EntryRow({ entry, reader, onCorrect }: EntryRowProps) {
  const { step, number, happenedOn, person, note, needs, signedBy, correctedBy } = entry;
  const words = entryWords(step, reader);
  const correction = reader.entries.find(({ id }) => id === correctedBy);
  return (
    <View role="listitem" style={styles.entry}>
      <View style={styles.words}>
        <Body struck={correctedBy !== null}>{words}</Body>
        <Small>{`${number} · ${dayWords(happenedOn)} · ${person.name}`}</Small>
        {note ? <Small tone="text">{note}</Small> : null}
        {correctedBy !== null ? <Strong>{takenBackWords(correction)}</Strong> : null}
        {signedBy ? <Small>{`Signed by ${signedBy.name}`}</Small> : null}
        {needs !== null && signedBy === null && correctedBy === null ? (
          <Small tone="text">{`Not signed; for ${SIGNER_WORDS[needs]}`}</Small>
        ) : null}
      </View>
      {onCorrect ? (
        <IconButton
          icon="edit"
          color="textSoft"
          label={`Correct no. ${number}: ${words}`}
          onPress={onCorrect}
        />
      ) : null}
    </View>
  );
}

function takenBackWords(correction: WheelEntryView | undefined): string {
  if (correction?.step.kind !== 'correction') return 'Taken back by a later entry.';
  return `Taken back by no.\u00a0${correction.number}: ${correction.step.reason}`;
}

const styles = StyleSheet.create({
  list: { borderTopWidth: stroke.hairline, borderTopColor: colors.rule },
  entry: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space[2],
    paddingVertical: space[2],
    borderBottomWidth: stroke.hairline,
    borderBottomColor: colors.rule,
  },
  words: { flexGrow: 1, flexShrink: 1, flexBasis: 0, minWidth: 0 },
});
