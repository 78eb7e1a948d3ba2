export { StudiesScreen as default } from '@/components/screens/studies/StudiesScreen';
