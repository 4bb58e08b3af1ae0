import { StyleSheet, View } from 'react-native';

import { sourceWords } from '@/features/plan';
import { CautionIcon } from '@/features/ui/caution-icon';
import { Heading, Reading, Small } from '@/features/ui/text';
import { space } from '@/features/ui/tokens';
import type { CautionSubject } from '@/shared/rules/caution';

import { belongsWords, cautionsOn, type PostedCaution } from '../subjects';

/** The cautions on one subject under its sign, each with where it comes from. */
export function Subject({ subject }: { subject: CautionSubject }) {
  return (
    <View style={styles.subject}>
      <CautionIcon subject={subject} size={56} />
      <View style={styles.cautions}>
        <Heading>{subject}</Heading>
        {cautionsOn(subject).map((caution) => (
          <View key={caution.id}>
            <Reading>{caution.words}</Reading>
            <Small>{[belongsWords(caution), sourceLine(caution)].filter(Boolean).join(' ')}</Small>
          </View>
        ))}
      </View>
    </View>
  );
}

export function sourceLine({ source }: PostedCaution): string {
  const { title, place, mark } = sourceWords(source);
  return `${[title, place].filter(Boolean).join(', ')} · ${mark}`;
}

const styles = StyleSheet.create({
  subject: { flexDirection: 'row', alignItems: 'flex-start', gap: space[4] },
  cautions: { flexGrow: 1, flexShrink: 1, flexBasis: 0, minWidth: 0, gap: space[4] },
});
