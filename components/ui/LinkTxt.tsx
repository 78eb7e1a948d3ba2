import { Link, type Href } from 'expo-router';
import type { ReactNode } from 'react';
import { StyleSheet } from 'react-native';
import type { TypeSize } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { textStyle, type Tone } from './textStyle';

interface LinkTxtProps {
  href: Href;
  children: ReactNode;
  variant?: TypeSize;
  tone?: Tone;
  strong?: boolean;
}

/** A link within text. */
export function LinkTxt({ href, children, variant, tone, strong }: LinkTxtProps) {
  const { colours } = useTheme();
  return (
    <Link href={href} style={[textStyle(colours, variant, tone, strong), styles.link]}>
      {children}
    </Link>
  );
}

const styles = StyleSheet.create({ link: { textDecorationLine: 'underline' } });
