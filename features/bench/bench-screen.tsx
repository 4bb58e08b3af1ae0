import { LoadProblem } from '@/features/records';
import { useShop } from '@/features/session';
import { NewSetup } from '@/features/setups';
import { Cell, Row } from '@/features/ui/card';
import { TextLink } from '@/features/ui/link';
import { Screen } from '@/features/ui/screen';
import { Skeleton } from '@/features/ui/skeleton';
import { Body } from '@/features/ui/text';

import { FirstSteps } from './components/first-steps';
import { AskingSetups, RecentSetups } from './components/setup-sections';
import { WheelsOut } from './components/wheels-out';
import { useBench } from './use-bench';

/** Home: what needs doing now. */
export function BenchScreen() {
  const { shop } = useShop();
  const { bench, error, retry } = useBench();
  const ready = bench !== null && Object.values(bench.counts).every((count) => count > 0);
  const content = () => {
    if (error) return <LoadProblem error={error} onRetry={retry} />;
    if (!bench) return <Skeleton label="Loading the bench" lines={6} />;
    return (
      <>
        {ready ? null : <FirstSteps counts={bench.counts} />}
        {bench.counts.setups > 0 ? <AskingSetups setups={bench.asking} /> : null}
        <Row gap={6} align="flex-start">
          {bench.recent.length > 0 ? (
            <Cell least={300}>
              <RecentSetups setups={bench.recent} />
            </Cell>
          ) : null}
          {bench.out.length > 0 ? (
            <Cell least={300}>
              <WheelsOut wheels={bench.out} />
            </Cell>
          ) : null}
        </Row>
        {bench.whole ? null : <Rest />}
      </>
    );
  };
  return (
    <Screen title="Bench" over={shop.name} actions={ready ? <NewSetup /> : null}>
      {content()}
    </Screen>
  );
}

function Rest() {
  const { shop } = useShop();
  const params = { shopId: shop.id };
  return (
    <Body>
      Only the setups changed last and the first wheels are looked at here. The rest:{' '}
      <TextLink label="all setups" href={{ pathname: '/shops/[shopId]/setups', params }} />
      {', '}
      <TextLink label="the whole rack" href={{ pathname: '/shops/[shopId]/wheels', params }} />.
    </Body>
  );
}
