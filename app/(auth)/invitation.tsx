export { InvitationScreen as default } from '@/components/screens/auth/InvitationScreen';
