import { useState, type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import { LinkRow, whenWords } from '@/features/records';
import { useShop } from '@/features/session';
import { IconButton } from '@/features/ui/button';
import { TextLink } from '@/features/ui/link';
import { List } from '@/features/ui/list-row';
import { Table, type Column } from '@/features/ui/table';
import { Body, Small } from '@/features/ui/text';
import { space } from '@/features/ui/tokens';
import { useLayout } from '@/features/ui/use-layout';
import { VerdictBadge } from '@/features/ui/verdict';
import type { SetupSummary } from '@/shared/contracts/setups';

import { OPERATION_WORDS, STATE_WORDS } from '../words';
import { SetupListMenu } from './setup-list-menu';

interface SetupListProps {
  setups: readonly SetupSummary[];
}

/** Setups with verdict, who and when: rows on a phone, a table on a wide screen. */
export function SetupList({ setups }: SetupListProps) {
  const { may } = useShop();
  const { wide } = useLayout();
  const [chosen, setChosen] = useState<string | null>(null);
  const menuOf = may('setup:draft')
    ? (setup: SetupSummary) => (
        <IconButton
          icon="menu"
          label={`More for ${setup.name}`}
          onPress={() => setChosen(setup.id)}
        />
      )
    : () => null;
  const asked = setups.find(({ id }) => id === chosen);
  const Rows = wide ? SetupTable : SetupRows;
  return (
    <>
      <Rows setups={setups} menuOf={menuOf} />
      {asked ? (
        <SetupListMenu key={asked.id} setup={asked} onClose={() => setChosen(null)} />
      ) : null}
    </>
  );
}

interface RowsProps extends SetupListProps {
  menuOf: (setup: SetupSummary) => ReactNode;
}

const usePlace = () => {
  const { shop } = useShop();
  return (setupId: string) =>
    ({
      pathname: '/shops/[shopId]/setups/[setupId]',
      params: { shopId: shop.id, setupId },
    }) as const;
};

function SetupTable({ setups, menuOf }: RowsProps) {
  const { shop } = useShop();
  const placeOf = usePlace();
  const columns: Column<SetupSummary>[] = [
    {
      id: 'name',
      label: 'Name',
      cell: ({ id, name }) => <TextLink label={name} href={placeOf(id)} />,
    },
    { id: 'operation', label: 'Operation', cell: ({ operation }) => OPERATION_WORDS[operation] },
    {
      id: 'verdict',
      label: 'Verdict',
      cell: ({ verdict, count }) => <VerdictBadge verdict={verdict} count={count} size="small" />,
    },
    { id: 'state', label: 'State', cell: ({ state }) => STATE_WORDS[state] },
    {
      id: 'changed',
      label: 'Last changed',
      cell: ({ updatedAt, updatedByName }) =>
        `${whenWords(updatedAt, shop.timeZone)}, ${updatedByName}`,
    },
    { id: 'more', label: 'More', cell: menuOf },
  ];
  return <Table caption="Setups" columns={columns} rows={setups} rowKey={({ id }) => id} />;
}

function SetupRows({ setups, menuOf }: RowsProps) {
  const { shop } = useShop();
  const placeOf = usePlace();
  return (
    <List label="Setups">
      {setups.map((setup) => (
        <LinkRow key={setup.id} label={setup.name} href={placeOf(setup.id)} beside={menuOf(setup)}>
          <View style={styles.facts}>
            <VerdictBadge verdict={setup.verdict} count={setup.count} size="small" />
            <Body>{OPERATION_WORDS[setup.operation]}</Body>
            {setup.state === 'draft' ? null : <Body>{STATE_WORDS[setup.state]}</Body>}
          </View>
          <Small>{`${whenWords(setup.updatedAt, shop.timeZone)}, ${setup.updatedByName}`}</Small>
        </LinkRow>
      ))}
    </List>
  );
}

const styles = StyleSheet.create({
  facts: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', gap: space[3] },
});
