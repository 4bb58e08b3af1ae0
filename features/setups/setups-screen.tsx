import { useInfiniteQuery } from '@tanstack/react-query';
import { useEffect } from 'react';

import { LoadProblem, MorePages, SearchField, useAddressPart } from '@/features/records';
import { useShop } from '@/features/session';
import { Row } from '@/features/ui/card';
import { Chip } from '@/features/ui/chip';
import { EmptyState } from '@/features/ui/empty-state';
import { Screen } from '@/features/ui/screen';
import { Skeleton } from '@/features/ui/skeleton';
import { TEXT_LIMITS } from '@/shared/domain/limits';
import { OPERATIONS } from '@/shared/domain/setups';

import { SetupList } from './components/setup-list';
import { NewSetup } from './components/setup-list-new';
import { setupQueries } from './queries';
import { OPERATION_WORDS } from './words';

/** The shop's setups, the last changed first; retired ones only when asked for. */
export function SetupsScreen() {
  const { shop } = useShop();
  const [search] = useAddressPart('search');
  const [asked, setAsked] = useAddressPart('operation');
  const [state, setState] = useAddressPart('state');
  const operation = OPERATIONS.find((known) => known === asked);
  const retired = state === 'retired';
  const query = useInfiniteQuery(
    setupQueries.list(shop.id, { search, operation, ...(retired ? { state: 'retired' } : {}) }),
  );
  const { hasNextPage, isFetching, isFetchNextPageError, fetchNextPage } = query;
  const setups = (query.data?.pages.flatMap(({ items }) => items) ?? []).filter(
    (setup) => retired || setup.state !== 'retired',
  );
  const none = setups.length === 0;
  // A page that holds nothing but retired setups shows nothing: go on to the next.
  useEffect(() => {
    if (none && hasNextPage && !isFetching && !isFetchNextPageError) void fetchNextPage();
  }, [none, hasNextPage, isFetching, isFetchNextPageError, fetchNextPage]);
  const filtered = Boolean(search || operation || retired);

  const found = () => {
    if (query.isPending || (none && query.isFetchingNextPage))
      return <Skeleton label="Loading the setups" />;
    if (none)
      return query.error ? (
        <LoadProblem error={query.error} onRetry={query.refetch} />
      ) : filtered ? (
        <EmptyState title="No setup found" icon="search">
          Nothing fits this search. Take a filter off, or look for a part of the name.
        </EmptyState>
      ) : (
        <EmptyState title="No setups yet" icon="setups" action={<NewSetup />}>
          A setup is one job planned: speeds, limits, passes and dressing, with all that speaks
          against it.
        </EmptyState>
      );
    return (
      <>
        <SetupList setups={setups} />
        <MorePages query={query} label="Show more setups" />
      </>
    );
  };

  return (
    <Screen title="Setups" over={shop.name} actions={none && !filtered ? null : <NewSetup />}>
      <SearchField
        name="setups-search"
        label="Search"
        hint="A part of the name."
        maxLength={TEXT_LIMITS.name}
      />
      <Row gap={2}>
        {OPERATIONS.map((known) => (
          <Chip
            key={known}
            label={OPERATION_WORDS[known]}
            on={operation === known}
            onToggle={() => setAsked(operation === known ? '' : known)}
          />
        ))}
        <Chip label="Retired" on={retired} onToggle={() => setState(retired ? '' : 'retired')} />
      </Row>
      {found()}
    </Screen>
  );
}
