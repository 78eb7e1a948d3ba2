export { ConfidenceScreen as default } from '@/components/screens/confidence/ConfidenceScreen';
