export { ScenariosScreen as default } from '@/components/screens/scenarios/ScenariosScreen';
