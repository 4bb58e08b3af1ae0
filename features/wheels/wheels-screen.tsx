import { useInfiniteQuery } from '@tanstack/react-query';
import { ScrollView, StyleSheet, View } from 'react-native';

import { PlanReader } from '@/features/plan';
import { LoadProblem, MorePages, SearchField, shopDay, useAddressPart } from '@/features/records';
import { useShop } from '@/features/session';
import { EmptyState } from '@/features/ui/empty-state';
import { ButtonLink } from '@/features/ui/link';
import { Screen } from '@/features/ui/screen';
import { Skeleton } from '@/features/ui/skeleton';
import { Small } from '@/features/ui/text';
import { colors, space, stroke } from '@/features/ui/tokens';
import { useLayout } from '@/features/ui/use-layout';
import type { Wheel } from '@/shared/contracts/wheels';
import { TEXT_LIMITS } from '@/shared/domain/limits';

import { WheelDetail } from './components/wheel-detail';
import { WheelList, WheelTable } from './components/wheel-table';
import { wheelQueries } from './queries';

/** The Rack: the shop's wheels. */
export function WheelsScreen() {
  const { shop, units, may } = useShop();
  const { wide } = useLayout();
  const [search] = useAddressPart('search');
  const [chosen] = useAddressPart('wheel');
  const query = useInfiniteQuery(wheelQueries.list(shop.id, search));
  const wheels = query.data?.pages.flatMap(({ items }) => items) ?? [];
  const current = wheels.find(({ id }) => id === chosen) ?? wheels[0];
  const today = shopDay(shop.timeZone);
  const add = may('wheel:edit') ? (
    <ButtonLink
      label="Add a wheel"
      kind="primary"
      icon="add"
      href={{ pathname: '/shops/[shopId]/wheels/new', params: { shopId: shop.id } }}
    />
  ) : null;

  const found = () => {
    if (query.isPending) return <Skeleton label="Loading the rack" />;
    if (wheels.length === 0)
      return query.error ? (
        <LoadProblem error={query.error} onRetry={query.refetch} />
      ) : search ? (
        <EmptyState title="No wheel found" icon="search">
          {`No tag or marking holds "${search}". Try a part of it.`}
        </EmptyState>
      ) : (
        <EmptyState title="No wheels yet" icon="rack" action={add}>
          {add
            ? 'The rack keeps every wheel with its marking and sizes, so that a plan knows how fast it may run.'
            : 'The rack keeps every wheel with its marking and sizes. A lead or machinist adds the first one.'}
        </EmptyState>
      );
    return (
      <>
        {wide ? (
          <WheelTable wheels={wheels} today={today} current={current?.id ?? ''} />
        ) : (
          <WheelList wheels={wheels} today={today} />
        )}
        <Small>{countWords(wheels.length, query.hasNextPage)}</Small>
        <MorePages query={query} label="Show more wheels" />
      </>
    );
  };

  return (
    <PlanReader units={units}>
      <Screen title="Rack" over={shop.name} actions={wheels.length > 0 ? add : null}>
        <View style={wide ? styles.both : null}>
          <View style={wide ? styles.list : styles.stack}>
            <SearchField
              name="rack-search"
              label="Search"
              hint="A part of the tag or of the marking."
              maxLength={TEXT_LIMITS.marking}
            />
            {found()}
          </View>
          {wide && current ? <Beside wheel={current} today={today} /> : null}
        </View>
      </Screen>
    </PlanReader>
  );
}

function Beside({ wheel, today }: { wheel: Wheel; today: string }) {
  return (
    <View role="region" aria-label={`Wheel ${wheel.tag}`} style={styles.beside}>
      <ScrollView contentContainerStyle={styles.stack}>
        <WheelDetail wheel={wheel} today={today} />
      </ScrollView>
    </View>
  );
}

function countWords(count: number, more: boolean): string {
  if (more) return `The first ${count} wheels`;
  return count === 1 ? '1 wheel' : `${count} wheels`;
}

const styles = StyleSheet.create({
  both: { flexDirection: 'row', gap: space[6], alignItems: 'flex-start' },
  list: { flexGrow: 3, flexShrink: 1, flexBasis: 520, minWidth: 0, gap: space[4] },
  stack: { gap: space[4] },
  beside: {
    flexGrow: 2,
    flexShrink: 1,
    flexBasis: 340,
    minWidth: 0,
    paddingLeft: space[6],
    borderLeftWidth: stroke.hairline,
    borderLeftColor: colors.rule,
  },
});
