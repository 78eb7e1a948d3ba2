import type { ReactNode } from 'react';
import { Modal, Pressable, ScrollView, StyleSheet, View } from 'react-native';
import { hairline, radius, space } from '../theme/tokens';
import { useBreakpoint } from '../theme/useBreakpoint';
import { useTheme } from '../theme/useTheme';
import { Txt } from './Txt';

interface DialogProps {
  title: string;
  open: boolean;
  /** Esc, and a press beside it; left out where it must be answered. */
  onClose?: () => void;
  children: ReactNode;
  /** Buttons, the one to press first. */
  actions?: ReactNode;
}

/** Keeps the focus within while it is open and gives it back after; on a phone it rises from below. */
export function Dialog({ title, open, onClose, children, actions }: DialogProps) {
  const { colours } = useTheme();
  const { isWide } = useBreakpoint();
  return (
    <Modal
      visible={open}
      transparent
      animationType="none"
      onRequestClose={onClose}
      aria-label={title}
    >
      <View style={[styles.scrim, isWide ? styles.centred : styles.below]}>
        <Pressable
          style={StyleSheet.absoluteFill}
          aria-hidden
          tabIndex={-1}
          onPress={onClose}
          disabled={!onClose}
        />
        <View
          style={[
            styles.box,
            isWide ? styles.boxWide : styles.boxPhone,
            { backgroundColor: colours.card, borderColor: colours.line },
          ]}
        >
          <ScrollView contentContainerStyle={styles.content}>
            <Txt variant="title" strong heading={2}>
              {title}
            </Txt>
            {children}
          </ScrollView>
          {actions ? <View style={styles.actions}>{actions}</View> : null}
        </View>
      </View>
    </Modal>
  );
}

const styles = StyleSheet.create({
  scrim: { flex: 1, backgroundColor: 'rgba(10, 16, 18, 0.55)' },
  centred: { alignItems: 'center', justifyContent: 'center' },
  below: { justifyContent: 'flex-end' },
  box: { borderWidth: hairline, maxHeight: '88%' },
  boxWide: { width: 520, borderRadius: radius.card },
  boxPhone: { borderTopLeftRadius: radius.card, borderTopRightRadius: radius.card },
  content: { padding: space.three, gap: space.two },
  actions: {
    paddingHorizontal: space.three,
    paddingBottom: space.three,
    flexDirection: 'row',
    flexWrap: 'wrap',
    gap: space.one,
  },
});
