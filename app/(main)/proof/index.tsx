export { ProofScreen as default } from '@/components/screens/verificationCases/ProofScreen';
