import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';

import { LoadProblem } from '@/features/records';
import { useShop } from '@/features/session';
import { Button } from '@/features/ui/button';
import { Row, Stack } from '@/features/ui/card';
import { EmptyState } from '@/features/ui/empty-state';
import { Screen } from '@/features/ui/screen';
import { Skeleton } from '@/features/ui/skeleton';
import { Body, Heading, Small } from '@/features/ui/text';

import { AppointmentList } from './components/appointment-list';
import { AppointSheet } from './components/appoint-sheet';
import { appointmentQueries } from './queries';

/** Who may mount, dress and trial-run the shop's wheels. */
export function AppointmentsScreen() {
  const { shop, may } = useShop();
  const query = useQuery(appointmentQueries.list(shop.id));
  const [appointing, setAppointing] = useState(false);
  const appoint = may('shop:appoint') ? (
    <Button
      kind="primary"
      icon="add"
      label="Appoint somebody"
      onPress={() => setAppointing(true)}
    />
  ) : null;
  const content = () => {
    if (query.isPending) return <Skeleton label="Loading the register" />;
    if (!query.data) return <LoadProblem error={query.error} onRetry={query.refetch} />;
    const { items } = query.data;
    const holding = items.filter(({ holds }) => holds);
    const others = items.filter(({ holds }) => !holds);
    if (items.length === 0)
      return (
        <EmptyState title="Nobody is appointed yet" icon="person" action={appoint}>
          The register names who may mount, dress and trial-run wheels. Until somebody stands in it
          every such entry waits for a signature that nobody can give.
        </EmptyState>
      );
    return (
      <Stack gap={6}>
        {holding.length > 0 ? (
          <AppointmentList label="Appointed now" appointments={holding} />
        ) : (
          <Body>Nobody is appointed today.</Body>
        )}
        {appoint ? (
          <Row>{appoint}</Row>
        ) : (
          <Small>A lead appoints people, and ends appointments.</Small>
        )}
        {others.length > 0 ? (
          <Stack gap={2}>
            <Heading>Ended, or not begun</Heading>
            <AppointmentList label="Ended, or not begun" appointments={others} />
          </Stack>
        ) : null}
      </Stack>
    );
  };
  return (
    <Screen
      title="Appointed people"
      over={shop.name}
      backTo={{ pathname: '/shops/[shopId]/shop', params: { shopId: shop.id } }}
      width="form"
    >
      <Body>
        They mount, dress and trial-run wheels of their class, and sign for what others did.
      </Body>
      {content()}
      {appointing ? <AppointSheet onClose={() => setAppointing(false)} /> : null}
    </Screen>
  );
}
