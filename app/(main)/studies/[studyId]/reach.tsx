export { ReachScreen as default } from '@/components/screens/reach/ReachScreen';
