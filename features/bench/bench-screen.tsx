import { useInfiniteQuery, useQuery } from '@tanstack/react-query';

import { machineQueries } from '@/features/machines';
import { LinkRow, LoadProblem, shopDay, whenWords } from '@/features/records';
import { useShop } from '@/features/session';
import { NewSetup, SetupList, setupQueries } from '@/features/setups';
import { Cell, Row, Stack } from '@/features/ui/card';
import { TextLink } from '@/features/ui/link';
import { List, ListRow } from '@/features/ui/list-row';
import { Screen } from '@/features/ui/screen';
import { Skeleton } from '@/features/ui/skeleton';
import { Body, Heading } from '@/features/ui/text';
import { standingOf, StandingWords, wheelQueries } from '@/features/wheels';

import { needingAttention, recentlyEdited } from './attention';
import { FirstSteps } from './first-steps';

const MOST_SHOWN = 8;

/** Home: what needs doing now. */
export function BenchScreen() {
  const { shop, person } = useShop();
  const setups = useInfiniteQuery(setupQueries.list(shop.id, {}));
  const wheels = useInfiniteQuery(wheelQueries.list(shop.id, ''));
  const lathes = useQuery(machineQueries.lathes(shop.id));
  const grinders = useQuery(machineQueries.grinders(shop.id));
  const queries = [setups, wheels, lathes, grinders];
  const failed = queries.find(({ data, error }) => error && !data);

  const content = () => {
    if (failed)
      return (
        <LoadProblem
          error={failed.error}
          onRetry={() => queries.forEach((query) => void query.refetch())}
        />
      );
    if (!setups.data || !wheels.data || !lathes.data || !grinders.data)
      return <Skeleton label="Loading the bench" lines={6} />;
    const known = setups.data.pages.flatMap(({ items }) => items);
    const racked = wheels.data.pages.flatMap(({ items }) => items);
    const counts = {
      lathes: lathes.data.items.length,
      grinders: grinders.data.items.length,
      wheels: racked.length,
      setups: known.length,
    };
    const asking = needingAttention(known, person.name);
    const recent = recentlyEdited(known, asking);
    const today = shopDay(shop.timeZone);
    const out = racked
      .filter(({ data }) => data.state !== 'scrapped')
      .map((wheel) => ({ wheel, standing: standingOf(wheel.data, today) }))
      .filter(({ standing }) => !standing.usable);
    const ready = Object.values(counts).every((count) => count > 0);
    return (
      <>
        {ready ? null : <FirstSteps counts={counts} />}
        {known.length === 0 ? null : (
          <Stack gap={2}>
            <Heading>Setups that need something</Heading>
            {asking.length === 0 ? (
              <Body>Nothing: every setup that was changed lately is clear.</Body>
            ) : (
              <SetupList setups={asking.slice(0, MOST_SHOWN)} />
            )}
          </Stack>
        )}
        <Row gap={6} align="flex-start">
          {recent.length === 0 ? null : (
            <Cell least={300}>
              <Stack gap={2}>
                <Heading>Clear, changed lately</Heading>
                <List label="Clear, changed lately">
                  {recent.slice(0, MOST_SHOWN).map(({ id, name, updatedAt, updatedByName }) => (
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
            </Cell>
          )}
          {out.length === 0 ? null : (
            <Cell least={300}>
              <Stack gap={2}>
                <Heading>Wheels that must not run</Heading>
                <List label="Wheels that must not run">
                  {out.slice(0, MOST_SHOWN).map(({ wheel, standing }) => (
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
            </Cell>
          )}
        </Row>
        {setups.hasNextPage || wheels.hasNextPage ? (
          <Body>
            Only the setups changed last and the first wheels are looked at here. The rest:{' '}
            <TextLink
              label="all setups"
              href={{ pathname: '/shops/[shopId]/setups', params: { shopId: shop.id } }}
            />
            {', '}
            <TextLink
              label="the whole rack"
              href={{ pathname: '/shops/[shopId]/wheels', params: { shopId: shop.id } }}
            />
            .
          </Body>
        ) : null}
      </>
    );
  };

  return (
    <Screen title="Bench" over={shop.name} actions={setups.data && !failed ? <NewSetup /> : null}>
      {content()}
    </Screen>
  );
}
