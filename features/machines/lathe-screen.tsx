import { useQuery } from '@tanstack/react-query';
import { useLocalSearchParams } from 'expo-router';

import { useShop } from '@/features/session';

import { MachineFacts } from './components/machine-facts';
import { MachineWaiting } from './components/machine-waiting';
import { LatheForm } from './lathe-form';
import { latheValuesOf } from './lathe-values';
import { latheParts } from './parts';
import { useMachinesPlace } from './place';
import { machineQueries } from './queries';

export function LatheScreen() {
  const { latheId } = useLocalSearchParams<{ latheId: string }>();
  const { shop, units, may } = useShop();
  const machines = useMachinesPlace();
  const query = useQuery(machineQueries.lathes(shop.id));
  const lathe = query.data?.items.find(({ id }) => id === latheId);
  if (!lathe) return <MachineWaiting noun="lathe" query={query} />;
  if (may('machine:edit')) return <LatheForm key={lathe.id} lathe={lathe} backTo={machines} />;
  return (
    <MachineFacts title={lathe.name} parts={latheParts} values={latheValuesOf(lathe, units)} />
  );
}
