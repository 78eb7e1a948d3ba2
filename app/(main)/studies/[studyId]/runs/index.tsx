export { RunsScreen as default } from '@/components/screens/runs/RunsScreen';
