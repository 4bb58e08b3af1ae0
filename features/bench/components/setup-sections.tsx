import { whenWords } from '@/features/records';
import { useShop } from '@/features/session';
import { SetupList } from '@/features/setups';
import { Stack } from '@/features/ui/card';
import { List, ListRow } from '@/features/ui/list-row';
import { Body, Heading } from '@/features/ui/text';
import type { SetupSummary } from '@/shared/contracts/setups';

interface SetupsProps {
  setups: readonly SetupSummary[];
}

const MOST_SHOWN = 8;

/** Drafts that cannot go on as they are, with what stops them. */
export function AskingSetups({ setups }: SetupsProps) {
  return (
    <Stack gap={2}>
      <Heading>Setups that need something</Heading>
      {setups.length === 0 ? (
        <Body>Nothing: every setup that was changed lately is clear.</Body>
      ) : (
        <SetupList setups={setups.slice(0, MOST_SHOWN)} />
      )}
    </Stack>
  );
}

export function RecentSetups({ setups }: SetupsProps) {
  const { shop } = useShop();
  return (
    <Stack gap={2}>
      <Heading>Clear, changed lately</Heading>
      <List label="Clear, changed lately">
        {setups.slice(0, MOST_SHOWN).map(({ id, name, updatedAt, updatedByName }) => (
          <ListRow
            key={id}
            label={name}
            detail={`${whenWords(updatedAt, shop.timeZone)}, ${updatedByName}`}
            href={{
              pathname: '/shops/[shopId]/setups/[setupId]',
              params: { shopId: shop.id, setupId: id },
            }}
          />
        ))}
      </List>
    </Stack>
  );
}
