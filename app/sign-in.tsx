export { SignInScreen as default } from '@/features/session/sign-in-screen';
