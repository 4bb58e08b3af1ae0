export { ShopFrame } from './components/shop-frame';
export { shopPlaces } from './places';
