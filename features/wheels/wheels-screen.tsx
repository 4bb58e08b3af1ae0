import { useInfiniteQuery } from '@tanstack/react-query';
import { useLocalSearchParams } from 'expo-router';
import { useState } from 'react';
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

import { RackFilters } from './components/rack-filters';
import { SetAsideSheet } from './components/set-aside';
import { WheelPage } from './components/wheel-page';
import { WheelList, WheelTable } from './components/wheel-table';
import { wheelQueries, type WheelSearch } from './queries';
import { searchOf } from './rack-filters';

/** The Rack: the shop's wheels. */
export function WheelsScreen() {
  const { shop, units, may } = useShop();
  const { wide } = useLayout();
  const address = useLocalSearchParams<Record<string, string>>();
  const [chosen] = useAddressPart('wheel');
  const [asked, setAsked] = useState<Wheel | null>(null);
  const search = searchOf(address);
  const query = useInfiniteQuery(wheelQueries.list(shop.id, search));
  const wheels = query.data?.pages.flatMap(({ items }) => items) ?? [];
  const current = chosen || wheels[0]?.id || null;
  const today = shopDay(shop.timeZone);
  const add = may('wheel:edit') ? (
    <ButtonLink
      label="Add a wheel"
      kind="primary"
      icon="add"
      href={{ pathname: '/shops/[shopId]/wheels/new', params: { shopId: shop.id } }}
    />
  ) : null;
  const isNarrowed = Object.keys(search).some((key) => key !== 'sort' && key !== 'order');

  const found = () => {
    if (query.isPending) return <Skeleton label="Loading the rack" />;
    if (query.error && wheels.length === 0)
      return <LoadProblem error={query.error} onRetry={query.refetch} />;
    if (wheels.length === 0)
      return isNarrowed ? (
        <NothingFound search={search} />
      ) : (
        <EmptyState title="No wheels yet" icon="rack" action={add}>
          {add
            ? 'The rack keeps every wheel with its marking and sizes, so that a plan knows how fast it may run.'
            : 'The rack keeps every wheel with its marking and sizes. A lead or machinist adds the first one.'}
        </EmptyState>
      );
    const rows = {
      wheels,
      today,
      ...(may('wheel:set-aside') ? { onSetAside: setAsked } : {}),
    };
    return (
      <>
        {wide ? <WheelTable {...rows} current={current ?? ''} /> : <WheelList {...rows} />}
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
            <RackFilters search={search} today={today} />
            {found()}
          </View>
          {wide && current !== null ? (
            <View role="region" aria-label="The chosen wheel" style={[styles.beside, IN_VIEW]}>
              <ScrollView contentContainerStyle={styles.stack}>
                <WheelPage key={current} wheelId={current} />
              </ScrollView>
            </View>
          ) : null}
        </View>
      </Screen>
      {asked ? <SetAsideSheet wheel={asked} onClose={() => setAsked(null)} /> : null}
    </PlanReader>
  );
}

function NothingFound({ search: { search, ...filters } }: { search: WheelSearch }) {
  const filtered = Object.keys(filters).some((key) => key !== 'sort' && key !== 'order');
  return (
    <EmptyState title="No wheel found" icon="search">
      {[
        search ? `No tag or marking holds "${search}". Try a part of it.` : '',
        filtered ? 'No wheel passes every filter that is on. Take one off to see more.' : '',
      ]
        .filter(Boolean)
        .join(' ')}
    </EmptyState>
  );
}

function countWords(count: number, more: boolean): string {
  if (more) return `The first ${count} wheels`;
  return count === 1 ? '1 wheel' : `${count} wheels`;
}

// Stays beside the table however far that is scrolled; styles of the web that React Native's types do not know.
const IN_VIEW: object = { position: 'sticky', top: 0, maxHeight: 'calc(100vh - 96px)' };

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
