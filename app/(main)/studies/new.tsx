export { NewStudyScreen as default } from '@/components/screens/studies/NewStudyScreen';
