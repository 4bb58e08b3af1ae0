export { WheelScreen as default } from '@/features/wheels/wheel-screen';
