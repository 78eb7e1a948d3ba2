export { StudyScreen as default } from '@/components/screens/studies/StudyScreen';
