import { useQuery } from '@tanstack/react-query';

import { machineQueries } from '@/features/machines';
import { useShop } from '@/features/session';
import { Card, Cell, Row, Stack } from '@/features/ui/card';
import { Heading, Small, Strong } from '@/features/ui/text';
import type { WheelData } from '@/shared/domain/wheels';

import { runsOn } from '../runs-on';

/** On which grinders of the shop the wheel fits, and on which belt steps it stays within its limits. */
export function WhereItMayRun({ wheel, today }: { wheel: WheelData; today: string }) {
  const { shop } = useShop();
  const { data } = useQuery(machineQueries.grinders(shop.id));
  if (!data || data.items.length === 0) return null;
  return (
    <Stack gap={2}>
      <Heading>Where it may run</Heading>
      <Row>
        {data.items.map((grinder) => (
          <Cell key={grinder.id} least={160}>
            <Card>
              <Strong>{grinder.name}</Strong>
              {runsOn(grinder, { wheel, today, rules: shop.rules }).map((words) => (
                <Small key={words}>{words}</Small>
              ))}
            </Card>
          </Cell>
        ))}
      </Row>
    </Stack>
  );
}
