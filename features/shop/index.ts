export { ShopFrame } from './components/shop-frame';
export { shopPlaces } from './places';
export { shopQueries } from './queries';
export { ROLE_WORDS } from './words';
