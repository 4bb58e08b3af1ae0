import { Redirect } from 'expo-router';

import { useShop } from '@/features/session';

import { LatheForm } from './lathe-form';
import { useMachinesPlace } from './place';

export function LatheNewScreen() {
  const { may } = useShop();
  const machines = useMachinesPlace();
  if (!may('machine:edit')) return <Redirect href={machines} />;
  return <LatheForm lathe={null} backTo={machines} />;
}
