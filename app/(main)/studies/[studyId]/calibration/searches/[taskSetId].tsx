export { SearchScreen as default } from '@/components/screens/calibration/SearchScreen';
