import { LinkRow } from '@/features/records';
import { useShop } from '@/features/session';
import { Stack } from '@/features/ui/card';
import { List } from '@/features/ui/list-row';
import { Heading } from '@/features/ui/text';
import { StandingWords } from '@/features/wheels';

import type { WheelOut } from '../attention';

const MOST_SHOWN = 8;

/** Wheels that are set aside, expired, or not yet looked at, rung or marked. */
export function WheelsOut({ wheels }: { wheels: readonly WheelOut[] }) {
  const { shop } = useShop();
  return (
    <Stack gap={2}>
      <Heading>Wheels that must not run</Heading>
      <List label="Wheels that must not run">
        {wheels.slice(0, MOST_SHOWN).map(({ wheel, standing }) => (
          <LinkRow
            key={wheel.id}
            label={[wheel.tag, wheel.data.marking].filter(Boolean).join(' · ')}
            href={{
              pathname: '/shops/[shopId]/wheels/[wheelId]',
              params: { shopId: shop.id, wheelId: wheel.id },
            }}
          >
            <StandingWords {...standing} />
          </LinkRow>
        ))}
      </List>
    </Stack>
  );
}
