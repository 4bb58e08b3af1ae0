import { StyleSheet, View } from 'react-native';

import { useShop } from '@/features/session';
import { Card, Cell, Row, Stack } from '@/features/ui/card';
import { VerdictIcon } from '@/features/ui/icon';
import { Heading, Small, Strong } from '@/features/ui/text';
import { space } from '@/features/ui/tokens';
import type { WheelLife } from '@/shared/contracts/wheel-entries';

import { spindleLimitWords, stepsWords, type Spindle } from '../spindle-words';

/** Which of the shop's spindles and belt steps may take the wheel, and why the others may not. */
export function SpindleList({ life }: { life: WheelLife }) {
  const { spindles, standing } = life;
  const grinders = [...new Set(spindles.map(({ grinderId }) => grinderId))];
  return (
    <Stack gap={2}>
      <Heading>Where it may run</Heading>
      {grinders.length === 0 ? (
        <Small>The shop has no grinder with a quill or an arbor on record yet.</Small>
      ) : (
        <Small>By fit and speed alone, whatever its state.</Small>
      )}
      <Row>
        {grinders.map((grinderId) => {
          const own = spindles.filter((spindle) => spindle.grinderId === grinderId);
          return (
            <Cell key={grinderId} least={260}>
              <Card>
                <Strong>{own[0]?.grinderName ?? ''}</Strong>
                {own.map((spindle) => (
                  <Taken
                    key={spindle.quillId}
                    spindle={spindle}
                    here={spindle.quillId === standing.onSpindle?.quillId}
                  />
                ))}
              </Card>
            </Cell>
          );
        })}
      </Row>
    </Stack>
  );
}

function Taken({ spindle, here }: { spindle: Spindle; here: boolean }) {
  const { units } = useShop();
  const { quillName, refusal } = spindle;
  return (
    <View style={styles.spindle}>
      <View style={styles.name}>
        <VerdictIcon verdict={refusal === null ? 'clear' : 'stop'} size={18} />
        <Small tone="text">{here ? `${quillName}: it sits here` : quillName}</Small>
      </View>
      {refusal === null ? (
        <>
          <Small>{stepsWords(spindle, units)}</Small>
          <Small>{spindleLimitWords(spindle, units)}</Small>
        </>
      ) : (
        <Small>{refusal.words}</Small>
      )}
    </View>
  );
}

const styles = StyleSheet.create({
  spindle: { paddingTop: space[1] },
  name: { flexDirection: 'row', alignItems: 'center', gap: space[2] },
});
