export { LatheNewScreen as default } from '@/features/machines/lathe-new-screen';
