export { IssuedPreview as default } from '@/components/screens/issued/IssuedPreview';
