export { SignInScreen as default } from '@/components/screens/auth/SignInScreen';
