export { WheelNewScreen as default } from '@/features/wheels/wheel-new-screen';
