export { ShopScreen as default } from '@/features/shop/shop-screen';
