export { QuickCheckScreen as default } from '@/features/quick-check/quick-check-screen';
