import type { PlaceLink } from '@/features/ui/place';

/** The places of a shop, in the order of bar and rail, and the addresses that belong to each. */
export function shopPlaces(shopId: string): (PlaceLink & { holds: string[] })[] {
  const params = { shopId };
  const at = `/shops/${shopId}`;
  return [
    {
      name: 'bench',
      href: { pathname: '/shops/[shopId]', params },
      label: 'Bench',
      icon: 'bench',
      holds: [],
    },
    {
      name: 'setups',
      href: { pathname: '/shops/[shopId]/setups', params },
      label: 'Setups',
      icon: 'setups',
      holds: [`${at}/setups`],
    },
    {
      name: 'rack',
      href: { pathname: '/shops/[shopId]/wheels', params },
      label: 'Rack',
      icon: 'rack',
      holds: [`${at}/wheels`],
    },
    {
      name: 'board',
      href: { pathname: '/shops/[shopId]/board', params },
      label: 'Board',
      icon: 'board',
      holds: [`${at}/board`],
    },
    {
      name: 'shop',
      href: { pathname: '/shops/[shopId]/shop', params },
      label: 'Shop',
      icon: 'shop',
      holds: [`${at}/shop`, `${at}/machines`, `${at}/appointments`],
    },
  ];
}
