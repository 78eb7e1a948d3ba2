import type { TextStyle } from 'react-native';
import { fonts, type, type Colours, type TypeSize } from '../theme/tokens';

export type Tone = 'ink' | 'soft' | 'water' | 'earth' | 'ochre' | 'brick' | 'moss';

/** The one recipe for type, shared by text, inputs and what is drawn by the browser itself. */
export const textStyle = (
  colours: Colours,
  size: TypeSize = 'body',
  tone: Tone = 'ink',
  strong = false,
): TextStyle => ({
  ...type[size],
  color: colours[tone],
  fontFamily: `${strong ? fonts.semibold : fonts.regular}, system-ui, sans-serif`,
  fontVariant: ['tabular-nums'],
});

/** The same for a DOM element (select, table, label). */
export const domTextStyle = (
  colours: Colours,
  size: TypeSize = 'body',
  tone: Tone = 'ink',
  strong = false,
) => ({
  fontSize: type[size].fontSize,
  lineHeight: `${type[size].lineHeight}px`,
  color: colours[tone],
  fontFamily: `${strong ? fonts.semibold : fonts.regular}, system-ui, sans-serif`,
  fontWeight: 400,
  fontVariantNumeric: 'tabular-nums',
});
