export { GeometryScreen as default } from '@/components/screens/reach/edit/GeometryScreen';
