export { NotFoundScreen as default } from '@/features/ui/not-found-screen';
