import { Redirect } from 'expo-router';

import { useShop } from '@/features/session';

import { GrinderForm } from './grinder-form';
import { useMachinesPlace } from './place';

export function GrinderNewScreen() {
  const { may } = useShop();
  const machines = useMachinesPlace();
  if (!may('machine:edit')) return <Redirect href={machines} />;
  return <GrinderForm grinder={null} backTo={machines} />;
}
