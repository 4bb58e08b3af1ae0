export { GrinderNewScreen as default } from '@/features/machines/grinder-new-screen';
