export { NotFoundScreen as default } from '@/components/screens/auth/NotFoundScreen';
