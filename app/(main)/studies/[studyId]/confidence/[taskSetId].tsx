export { ConfidenceSetScreen as default } from '@/components/screens/confidence/ConfidenceSetScreen';
