import { Circle, Path } from 'react-native-svg';
import { useTheme } from '@/components/theme/useTheme';
import { lookOf, type MarkShape } from './curveLooks';

interface Props {
  x: number;
  y: number;
  look: number;
}

/** The mark that tells a curve from the others where colours cannot. */
export function CurveMark({ x, y, look }: Props) {
  const { colours } = useTheme();
  const { shape, colour } = lookOf(look);
  const stroke = { stroke: colours[colour], strokeWidth: 1.5 };
  if (shape === 'circle') return <Circle cx={x} cy={y} r={3.5} fill={colours.card} {...stroke} />;
  return (
    <Path d={PATHS[shape](x, y)} fill={shape === 'cross' ? 'none' : colours.card} {...stroke} />
  );
}

const PATHS: Record<Exclude<MarkShape, 'circle'>, (x: number, y: number) => string> = {
  square: (x, y) => `M${x - 3.5} ${y - 3.5}h7v7h-7Z`,
  triangle: (x, y) => `M${x} ${y - 4.5}l4.5 8h-9Z`,
  diamond: (x, y) => `M${x} ${y - 5}l5 5l-5 5l-5 -5Z`,
  cross: (x, y) => `M${x - 4} ${y - 4}l8 8M${x + 4} ${y - 4}l-8 8`,
};
