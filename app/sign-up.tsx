export { SignUpScreen as default } from '@/features/session/sign-up-screen';
