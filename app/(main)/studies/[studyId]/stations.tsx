export { StationsScreen as default } from '@/components/screens/studies/StationsScreen';
