export { ProofCaseScreen as default } from '@/components/screens/verificationCases/ProofCaseScreen';
