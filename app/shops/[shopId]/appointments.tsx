export { AppointmentsScreen as default } from '@/features/appointments/appointments-screen';
