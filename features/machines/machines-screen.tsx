import { useQuery } from '@tanstack/react-query';
import type { ReactNode } from 'react';

import { LoadProblem } from '@/features/records';
import { useShop } from '@/features/session';
import { Cell, Row, Stack } from '@/features/ui/card';
import { EmptyState } from '@/features/ui/empty-state';
import { ButtonLink } from '@/features/ui/link';
import { List, ListRow } from '@/features/ui/list-row';
import { Screen } from '@/features/ui/screen';
import { Skeleton } from '@/features/ui/skeleton';
import { Heading } from '@/features/ui/text';
import type { GrinderData, LatheData } from '@/shared/domain/machines';
import type { UnitSystem } from '@/shared/domain/people';
import { formatQuantity } from '@/shared/units/format';

import { machineQueries } from './queries';
import { DIAL_WORDS } from './words';

/** Lathes and tool-post grinders of the shop. */
export function MachinesScreen() {
  const { shop, units, may } = useShop();
  const lathes = useQuery(machineQueries.lathes(shop.id));
  const grinders = useQuery(machineQueries.grinders(shop.id));
  const params = { shopId: shop.id };
  const mayEdit = may('machine:edit');
  return (
    <Screen title="Machines" over={shop.name} backTo={{ pathname: '/shops/[shopId]/shop', params }}>
      <Row gap={6} align="flex-start">
        <Cell least={300}>
          <Kind
            title="Lathes"
            query={lathes}
            empty="A lathe brings its speeds, feeds and dials to every plan made for it."
            add={
              mayEdit ? (
                <ButtonLink
                  label="Add a lathe"
                  icon="add"
                  href={{ pathname: '/shops/[shopId]/machines/lathes/new', params }}
                />
              ) : null
            }
          >
            {lathes.data?.items.map(({ id, name, data }) => (
              <ListRow
                key={id}
                label={name}
                detail={latheWords(data, units)}
                href={{
                  pathname: '/shops/[shopId]/machines/lathes/[latheId]',
                  params: { ...params, latheId: id },
                }}
              />
            ))}
          </Kind>
        </Cell>
        <Cell least={300}>
          <Kind
            title="Tool-post grinders"
            query={grinders}
            empty="A grinder brings its belt steps, its quills and its guard to every plan made for it."
            add={
              mayEdit ? (
                <ButtonLink
                  label="Add a grinder"
                  icon="add"
                  href={{ pathname: '/shops/[shopId]/machines/grinders/new', params }}
                />
              ) : null
            }
          >
            {grinders.data?.items.map(({ id, name, data, quills }) => (
              <ListRow
                key={id}
                label={name}
                detail={grinderWords(data, quills.length, units)}
                href={{
                  pathname: '/shops/[shopId]/machines/grinders/[grinderId]',
                  params: { ...params, grinderId: id },
                }}
              />
            ))}
          </Kind>
        </Cell>
      </Row>
    </Screen>
  );
}

interface KindProps {
  title: string;
  query: {
    isPending: boolean;
    error: unknown;
    data?: { items: readonly unknown[] } | undefined;
    refetch: () => unknown;
  };
  empty: string;
  add: ReactNode;
  children: ReactNode;
}

function Kind({ title, query, empty, add, children }: KindProps) {
  const content = () => {
    if (query.isPending) return <Skeleton label={`Loading ${title.toLowerCase()}`} />;
    if (!query.data) return <LoadProblem error={query.error} onRetry={query.refetch} />;
    if (query.data.items.length === 0)
      return (
        <EmptyState title="None yet" action={add}>
          {add ? empty : `${empty} A lead or machinist adds the first one.`}
        </EmptyState>
      );
    return (
      <>
        <List label={title}>{children}</List>
        <Row>{add}</Row>
      </>
    );
  };
  return (
    <Stack>
      <Heading>{title}</Heading>
      {content()}
    </Stack>
  );
}

const counted = (count: number, one: string, many: string) =>
  `${count} ${count === 1 ? one : many}`;

function latheWords({ spindleSpeedsRpm, ...data }: LatheData, units: UnitSystem): string {
  const speeds = counted(spindleSpeedsRpm.length, 'speed', 'speeds');
  const [low, high] = [spindleSpeedsRpm[0] ?? 0, spindleSpeedsRpm.at(-1) ?? 0].map((value) =>
    formatQuantity({ value, unit: 'rpm' }, units, { withUnit: false }),
  );
  const division = formatQuantity({ value: data.crossSlideDivisionMm, unit: 'mm' }, units);
  return `${speeds}, ${low} to ${high}\u00a0rpm; dial ${division} on ${DIAL_WORDS[data.crossSlideReads]}`;
}

function grinderWords(data: GrinderData, quills: number, units: UnitSystem): string {
  const motor = formatQuantity({ value: data.motorNoLoadRpm, unit: 'rpm' }, units);
  const steps = counted(data.beltSteps.length, 'belt step', 'belt steps');
  return `motor ${motor}, ${steps}, ${counted(quills, 'quill or arbor', 'quills and arbors')}`;
}
