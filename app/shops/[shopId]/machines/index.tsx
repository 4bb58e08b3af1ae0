export { MachinesScreen as default } from '@/features/machines/machines-screen';
