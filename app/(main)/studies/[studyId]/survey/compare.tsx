export { CompareScreen as default } from '@/components/screens/survey/compare/CompareScreen';
