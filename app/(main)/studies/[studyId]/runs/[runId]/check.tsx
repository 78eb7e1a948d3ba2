export { CheckScreen as default } from '@/components/screens/check/CheckScreen';
