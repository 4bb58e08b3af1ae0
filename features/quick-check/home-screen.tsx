import { useQuery } from '@tanstack/react-query';
import { Redirect, type Href } from 'expo-router';

import { afterSignIn, sessionQueries } from '@/features/session';

import { QuickCheckScreen } from './quick-check-screen';

/** The first page: the quick check for visitors, the Bench for members. */
export function HomeScreen() {
  const session = useQuery(sessionQueries.current());
  if (session.data) return <Redirect href={afterSignIn(session.data, undefined) as Href} />;
  return <QuickCheckScreen />;
}
