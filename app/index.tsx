export { HomeScreen as default } from '@/features/quick-check/home-screen';
