export { SetupScreen as default } from '@/features/setups/setup-screen';
