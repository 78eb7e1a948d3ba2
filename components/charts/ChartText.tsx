import type { ReactNode } from 'react';
import { Text } from 'react-native-svg';
import { fonts, type } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/useTheme';

interface Props {
  x: number;
  y: number;
  anchor?: 'start' | 'middle' | 'end';
  tone?: 'soft' | 'ink' | 'earth' | 'ochre' | 'card';
  strong?: boolean;
  /** Stays legible where a line runs behind it. */
  halo?: boolean;
  children: ReactNode;
}

export const CHART_TEXT_SIZE = type.caption.fontSize;

/** A word or number of a drawing; `y` is its base line. */
export function ChartText({
  x,
  y,
  anchor = 'start',
  tone = 'soft',
  strong,
  halo,
  children,
}: Props) {
  const { colours } = useTheme();
  const type = {
    x,
    y,
    textAnchor: anchor,
    fontFamily: strong ? fonts.semibold : fonts.regular,
    fontSize: CHART_TEXT_SIZE,
  };
  return (
    <>
      {halo ? (
        <Text {...type} fill={colours.card} stroke={colours.card} strokeWidth={4} aria-hidden>
          {children}
        </Text>
      ) : null}
      <Text {...type} fill={colours[tone]}>
        {children}
      </Text>
    </>
  );
}
