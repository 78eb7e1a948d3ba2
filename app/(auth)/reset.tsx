export { ResetScreen as default } from '@/components/screens/auth/ResetScreen';
