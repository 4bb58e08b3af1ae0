import { useQuery } from '@tanstack/react-query';

import { LoadProblem } from '@/features/records';
import { useShop } from '@/features/session';
import { List, ListRow } from '@/features/ui/list-row';
import { Skeleton } from '@/features/ui/skeleton';

import { shopQueries } from '../queries';
import { ROLE_WORDS } from '../words';

/** Who belongs to the shop, and as what. */
export function Members() {
  const { shop, person } = useShop();
  const query = useQuery(shopQueries.members(shop.id));
  if (query.isPending) return <Skeleton label="Loading the people" lines={3} />;
  if (!query.data) return <LoadProblem error={query.error} onRetry={query.refetch} />;
  return (
    <List label="People">
      {query.data.items.map(({ personId, name, role }) => (
        <ListRow
          key={personId}
          label={personId === person.personId ? `${name} (you)` : name}
          detail={ROLE_WORDS[role]}
        />
      ))}
    </List>
  );
}
