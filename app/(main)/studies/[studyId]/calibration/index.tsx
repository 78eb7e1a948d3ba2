export { CalibrationScreen as default } from '@/components/screens/calibration/CalibrationScreen';
