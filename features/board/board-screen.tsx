import { View } from 'react-native';

import { useShop } from '@/features/session';
import { Card, Cell, Row } from '@/features/ui/card';
import { Screen } from '@/features/ui/screen';
import { Reading, Small } from '@/features/ui/text';

import { sourceLine, Subject } from './components/subject';
import { cautionsOn, FURTHER_SUBJECTS } from './subjects';

/** The cautions of the trade, by subject and with their sources. */
export function BoardScreen() {
  const { shop } = useShop();
  return (
    <Screen title="Board" over={shop.name}>
      <Card kind="engraved">
        {cautionsOn('First of all').map((caution) => (
          <View key={caution.id}>
            <Reading>{caution.words}</Reading>
            <Small>{sourceLine(caution)}</Small>
          </View>
        ))}
      </Card>
      <Row gap={8} align="flex-start">
        {FURTHER_SUBJECTS.map((subject) => (
          <Cell key={subject} least={400}>
            <Subject subject={subject} />
          </Cell>
        ))}
      </Row>
    </Screen>
  );
}
