export { CompareScreen as default } from '@/components/screens/compare/CompareScreen';
