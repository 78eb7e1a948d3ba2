import type { ReactNode, Ref } from 'react';
import { Text, type TextProps } from 'react-native';
import type { TypeSize } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { aria } from './aria';
import { textStyle, type Tone } from './textStyle';

interface TxtProps extends Omit<TextProps, 'children'> {
  variant?: TypeSize;
  tone?: Tone;
  /** Weight 600. */
  strong?: boolean;
  /** Makes it a heading of this level for screen readers; the look stays the variant's. */
  heading?: 1 | 2 | 3 | 4;
  children?: ReactNode;
  ref?: Ref<Text>;
}

/** All text of the interface. */
export function Txt({ variant, tone, strong, heading, style, ...rest }: TxtProps) {
  const { colours } = useTheme();
  return (
    <Text
      {...(heading ? { role: 'heading' as const, ...aria({ 'aria-level': heading }) } : null)}
      {...rest}
      style={[textStyle(colours, variant, tone, strong), style]}
    />
  );
}
