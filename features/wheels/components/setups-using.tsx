import { StyleSheet, View } from 'react-native';

import { LinkRow } from '@/features/records';
import { useShop } from '@/features/session';
import { Stack } from '@/features/ui/card';
import { List } from '@/features/ui/list-row';
import { Body, Heading, Small } from '@/features/ui/text';
import { space } from '@/features/ui/tokens';
import { VerdictBadge } from '@/features/ui/verdict';
import type { WheelLife } from '@/shared/contracts/wheel-entries';

/** The setups that use the wheel, with their verdicts. */
export function SetupsUsing({ setups }: { setups: WheelLife['setups'] }) {
  const { shop } = useShop();
  return (
    <Stack gap={2}>
      <Heading>Setups that use it</Heading>
      {setups.length === 0 ? (
        <Small>None yet. A setup that chooses this wheel stands here with its verdict.</Small>
      ) : (
        <List label="Setups that use it">
          {setups.map(({ id, name, state, verdict, count }) => (
            <LinkRow
              key={id}
              label={name}
              href={{
                pathname: '/shops/[shopId]/setups/[setupId]',
                params: { shopId: shop.id, setupId: id },
              }}
            >
              <View style={styles.facts}>
                <VerdictBadge verdict={verdict} count={count} size="small" />
                <Body>{state}</Body>
              </View>
            </LinkRow>
          ))}
        </List>
      )}
    </Stack>
  );
}

const styles = StyleSheet.create({
  facts: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', gap: space[3] },
});
