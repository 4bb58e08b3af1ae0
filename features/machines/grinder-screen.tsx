import { useQuery } from '@tanstack/react-query';
import { useLocalSearchParams } from 'expo-router';

import { useShop } from '@/features/session';

import { MachineFacts } from './components/machine-facts';
import { MachineWaiting } from './components/machine-waiting';
import { GrinderForm } from './grinder-form';
import { grinderValuesOf } from './grinder-values';
import { grinderParts } from './parts';
import { useMachinesPlace } from './place';
import { machineQueries } from './queries';

export function GrinderScreen() {
  const { grinderId } = useLocalSearchParams<{ grinderId: string }>();
  const { shop, units, may } = useShop();
  const machines = useMachinesPlace();
  const query = useQuery(machineQueries.grinders(shop.id));
  const grinder = query.data?.items.find(({ id }) => id === grinderId);
  if (!grinder) return <MachineWaiting noun="grinder" query={query} />;
  if (may('machine:edit'))
    return <GrinderForm key={grinder.id} grinder={grinder} backTo={machines} />;
  const values = grinderValuesOf(grinder, units);
  return <MachineFacts title={grinder.name} parts={grinderParts([values])} values={values} />;
}
