export { VerificationPage as default } from '@/components/screens/verification/VerificationPage';
