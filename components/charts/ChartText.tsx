import type { ReactNode } from 'react';
import { Text } from 'react-native-svg';
import { fonts, type } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/useTheme';

interface Props {
  x: number;
  y: number;
  anchor?: 'start' | 'middle' | 'end';
  tone?: 'soft' | 'ink' | 'earth' | 'ochre';
  strong?: boolean;
  children: ReactNode;
}

export const CHART_TEXT_SIZE = type.caption.fontSize;

/** A word or number of a drawing; `y` is its base line. */
export function ChartText({ x, y, anchor = 'start', tone = 'soft', strong, children }: Props) {
  const { colours } = useTheme();
  return (
    <Text
      x={x}
      y={y}
      textAnchor={anchor}
      fill={colours[tone]}
      fontFamily={strong ? fonts.semibold : fonts.regular}
      fontSize={CHART_TEXT_SIZE}
    >
      {children}
    </Text>
  );
}
