export { ProfileScreen as default } from '@/components/screens/profile/ProfileScreen';
