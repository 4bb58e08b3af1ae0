import type { UseQueryResult } from '@tanstack/react-query';

import { LoadProblem } from '@/features/records';
import { useShop } from '@/features/session';
import { EmptyState } from '@/features/ui/empty-state';
import { ButtonLink } from '@/features/ui/link';
import { Screen } from '@/features/ui/screen';
import { Skeleton } from '@/features/ui/skeleton';

import { useMachinesPlace } from '../place';

interface MachineWaitingProps {
  /** "lathe" or "grinder" */
  noun: string;
  query: Pick<UseQueryResult, 'isPending' | 'error' | 'refetch'>;
}

/** While a machine is fetched, and where it could not be. */
export function MachineWaiting({ noun, query }: MachineWaitingProps) {
  const { shop } = useShop();
  const machines = useMachinesPlace();
  const content = () => {
    if (query.isPending) return <Skeleton label={`Loading the ${noun}`} />;
    if (query.error) return <LoadProblem error={query.error} onRetry={query.refetch} />;
    return (
      <EmptyState
        title={`No such ${noun}`}
        action={<ButtonLink label="To the machines" href={machines} />}
      >
        {`The address may be mistyped, or the ${noun} belongs to another shop.`}
      </EmptyState>
    );
  };
  return (
    <Screen
      title={noun === 'lathe' ? 'Lathe' : 'Grinder'}
      over={shop.name}
      backTo={machines}
      width="form"
    >
      {content()}
    </Screen>
  );
}
