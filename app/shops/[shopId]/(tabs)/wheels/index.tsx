export { WheelsScreen as default } from '@/features/wheels/wheels-screen';
