export { GrinderScreen as default } from '@/features/machines/grinder-screen';
