export { SetupsScreen as default } from '@/features/setups/setups-screen';
