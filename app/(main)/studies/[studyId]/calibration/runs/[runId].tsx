export { ResidualsScreen as default } from '@/components/screens/calibration/ResidualsScreen';
