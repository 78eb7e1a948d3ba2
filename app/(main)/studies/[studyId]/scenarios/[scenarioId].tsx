export { ScenarioScreen as default } from '@/components/screens/scenarios/ScenarioScreen';
