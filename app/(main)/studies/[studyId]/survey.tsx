export { SurveyScreen as default } from '@/components/screens/survey/SurveyScreen';
