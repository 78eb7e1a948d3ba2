export { PeopleScreen as default } from '@/components/screens/people/PeopleScreen';
