export { SearchFormScreen as default } from '@/components/screens/calibration/SearchFormScreen';
