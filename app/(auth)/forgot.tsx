export { ForgotScreen as default } from '@/components/screens/auth/ForgotScreen';
