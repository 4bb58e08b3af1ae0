export { sessionQueries, useSignOut } from './queries';
export { ShopProvider, useShop } from './shop-context';
export { ShopGate } from './shop-gate';
export { TimeZoneSelect } from './time-zone-select';
export { afterSignIn } from './next-address';
