import type { ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { radius, space, type Colours } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import type { Tone } from './textStyle';
import { Txt } from './Txt';

export type NoticeTone = 'info' | 'attention' | 'danger' | 'done';

const LOOK: Record<NoticeTone, { ground: keyof Colours; tone: Tone }> = {
  info: { ground: 'earthTint', tone: 'ink' },
  attention: { ground: 'ochreTint', tone: 'ochre' },
  danger: { ground: 'brickTint', tone: 'brick' },
  done: { ground: 'mossTint', tone: 'moss' },
};

interface NoticeProps {
  tone?: NoticeTone;
  title?: string;
  children?: ReactNode;
  /** Stands there from the start: not announced. */
  still?: boolean;
}

/** An outcome or a caution, said where it belongs. */
export function Notice({ tone = 'info', title, children, still }: NoticeProps) {
  const { colours } = useTheme();
  const { ground, tone: ink } = LOOK[tone];
  const role = still ? 'note' : tone === 'danger' ? 'alert' : 'status';
  return (
    <View role={role} style={[styles.box, { backgroundColor: colours[ground] }]}>
      {title ? (
        <Txt strong tone={ink}>
          {title}
        </Txt>
      ) : null}
      {typeof children === 'string' ? <Txt>{children}</Txt> : children}
    </View>
  );
}

const styles = StyleSheet.create({
  box: { borderRadius: radius.control, padding: space.two, gap: space.one, alignSelf: 'stretch' },
});
