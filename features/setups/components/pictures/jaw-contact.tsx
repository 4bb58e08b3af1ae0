import { StyleSheet, View } from 'react-native';

import { Picture } from '@/features/ui/picture';
import { Small, Subheading } from '@/features/ui/text';
import { space } from '@/features/ui/tokens';
import type { UnitSystem } from '@/shared/domain/people';
import type { JawPlan } from '@/shared/rules/types';

import { ChuckDrawing } from './chuck-drawing';
import { chuckLayout, exaggeration } from './jaw-geometry';
import { jawSentences, offsetSentence } from './jaw-words';

interface JawContactProps {
  plan: JawPlan;
  /** Diameter at which the pads will be ground, and width across one pad. */
  boreMm: number;
  padWidthMm: number;
  units: UnitSystem;
  /** The same jaws as they stand after grinding, drawn beside the plan to the same scale. */
  after?: JawPlan;
}

const WIDEST = 380;

/** Where each jaw starts to touch: jaws to scale, their gaps exaggerated and said to be so. */
export function JawContactPicture({ plan, boreMm, padWidthMm, units, after }: JawContactProps) {
  const times = exaggeration(after ? [plan, after] : [plan], boreMm);
  const shown = { boreMm, padWidthMm, units, times };
  if (!after) return <ChuckView plan={plan} {...shown} />;
  return (
    <View style={styles.both}>
      <View style={styles.one}>
        <Subheading>Before</Subheading>
        <ChuckView plan={plan} {...shown} />
      </View>
      <View style={styles.one}>
        <Subheading>After</Subheading>
        <ChuckView plan={after} {...shown} />
      </View>
    </View>
  );
}

interface ChuckViewProps extends Omit<JawContactProps, 'after'> {
  times: number;
}

function ChuckView({ plan, times, units, ...sizes }: ChuckViewProps) {
  const sentences = jawSentences(plan, units);
  return (
    <View style={styles.view}>
      <Picture
        maxWidth={WIDEST}
        height={(width, textScale) => chuckLayout(width, plan, textScale).height}
        description={`Chuck seen from the tailstock with ${plan.contacts.length} jaws; the list below it says in which order they touch.`}
        caption={times > 1 ? `Offset drawn ${times} times too large` : 'Offset drawn to scale'}
      >
        {({ width, textScale }) => (
          <ChuckDrawing
            {...sizes}
            plan={plan}
            times={times}
            units={units}
            width={width}
            textScale={textScale}
          />
        )}
      </Picture>
      <View role="list" aria-label="Order of contact">
        {sentences.map((sentence) => (
          <View key={sentence.jaw} role="listitem">
            <Small tone="text">{sentence.words}</Small>
          </View>
        ))}
      </View>
      <Small>{offsetSentence(plan, units)}</Small>
    </View>
  );
}

const styles = StyleSheet.create({
  both: { flexDirection: 'row', flexWrap: 'wrap', gap: space[6] },
  one: { flexGrow: 1, flexShrink: 1, flexBasis: 260, minWidth: 0, gap: space[2] },
  view: { gap: space[3] },
});
