export { QueueScreen as default } from '@/components/screens/check/QueueScreen';
