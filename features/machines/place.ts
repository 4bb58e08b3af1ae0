import { useShop } from '@/features/session';

/** The list of machines, where every machine's page leads back to. */
export function useMachinesPlace() {
  const { shop } = useShop();
  return { pathname: '/shops/[shopId]/machines', params: { shopId: shop.id } } as const;
}
