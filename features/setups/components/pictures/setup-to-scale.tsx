import { StyleSheet, View } from 'react-native';

import { Picture } from '@/features/ui/picture';
import { Small } from '@/features/ui/text';
import { space } from '@/features/ui/tokens';
import type { UnitSystem } from '@/shared/domain/people';
import type { Plan, PlanInput } from '@/shared/rules';

import { SetupDrawing } from './setup-drawing';
import { setupLayout } from './setup-layout';
import { setupScene } from './setup-scene';
import { dimensionWords, setupSentences } from './setup-words';

interface SetupToScaleProps {
  input: PlanInput;
  plan: Plan;
  units: UnitSystem;
}

const WIDEST = 560;

/** Work, wheel and quill from above, to one scale, with the overrun at both ends and the ways they turn. */
export function SetupToScale({ input, plan, units }: SetupToScaleProps) {
  const scene = setupScene(input, plan);
  if (scene === null)
    return <Small>Drawn as soon as diameter and length of the work are known.</Small>;
  const layoutFor = (size: { width: number; textScale: number }) =>
    setupLayout(scene, size, (dimension) => dimensionWords(dimension, units));
  return (
    <View style={styles.view}>
      <Picture
        maxWidth={WIDEST}
        height={(width, textScale) => layoutFor({ width, textScale }).height}
        description="The set-up from above, to scale; the sentences below say what stands where."
      >
        {(size) => <SetupDrawing {...size} scene={scene} layout={layoutFor(size)} />}
      </Picture>
      <View role="list" aria-label="The set-up in words">
        {setupSentences(scene, { input, plan }, units).map((sentence) => (
          <View key={sentence} role="listitem">
            <Small tone="text">{sentence}</Small>
          </View>
        ))}
      </View>
    </View>
  );
}

const styles = StyleSheet.create({ view: { gap: space[3] } });
