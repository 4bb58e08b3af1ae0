export { LatheScreen as default } from '@/features/machines/lathe-screen';
