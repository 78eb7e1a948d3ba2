import { Link, type Href } from 'expo-router';
import { useId } from 'react';
import {
  Pressable,
  StyleSheet,
  View,
  type PressableStateCallbackType,
  type ViewStyle,
} from 'react-native';
import { radius, space, touch, type Colours } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { aria } from './aria';
import { Spinner } from './Spinner';
import { useIsStretched } from './stretchedButtons';
import { Txt } from './Txt';

export type ButtonKind = 'solid' | 'outline' | 'quiet' | 'danger';

interface ButtonProps {
  label: string;
  kind?: ButtonKind;
  onPress?: () => void;
  /** Makes it a link to another screen. */
  href?: Href;
  /** Under way: says so and takes no second press. */
  busy?: boolean;
  disabled?: boolean;
  /** Said beside it, e.g. why it is disabled. */
  hint?: string;
  /** Takes the whole width. */
  wide?: boolean;
  /** Name for screen readers where the label alone does not say which, e.g. "Remove Ines Corrow". */
  name?: string;
}

interface Look {
  ground: string;
  edge: string;
  ink: string;
}

const look = (kind: ButtonKind, c: Colours): Look => {
  if (kind === 'solid') return { ground: c.ink, edge: c.ink, ink: c.card };
  if (kind === 'danger') return { ground: 'transparent', edge: c.brick, ink: c.brick };
  if (kind === 'quiet') return { ground: 'transparent', edge: 'transparent', ink: c.ink };
  return { ground: 'transparent', edge: c.ink, ink: c.ink };
};

/** One solid button a screen: what to do next. */
export function Button(props: ButtonProps) {
  const { label, kind = 'outline', onPress, href, busy, disabled, hint, wide, name } = props;
  const { colours } = useTheme();
  const hintId = useId();
  const isStretched = useIsStretched() || wide;
  const { ground, edge, ink } = look(kind, colours);
  const off = Boolean(disabled || busy);

  const box = (state: PressableStateCallbackType & { hovered?: boolean }): ViewStyle => ({
    ...styles.box,
    ...(kind === 'quiet' ? styles.quiet : null),
    backgroundColor: ground,
    borderColor: edge,
    opacity: disabled && !busy ? 0.45 : state.pressed ? 0.75 : state.hovered ? 0.9 : 1,
  });
  const pressable = (
    <Pressable
      role={href ? 'link' : 'button'}
      aria-label={name}
      aria-busy={busy}
      aria-disabled={off}
      disabled={off}
      onPress={href ? undefined : onPress}
      {...aria({ 'aria-describedby': hint ? hintId : undefined })}
      // A link hands its style on through a slot, which takes no function.
      style={href ? box({ pressed: false, hovered: false }) : box}
    >
      {busy ? <Spinner size="small" colour={ink} /> : null}
      <Txt strong style={{ color: ink }}>
        {label}
      </Txt>
      {kind === 'quiet' ? (
        <View style={[styles.underline, { backgroundColor: colours.edge }]} />
      ) : null}
    </Pressable>
  );
  return (
    <View style={isStretched ? styles.wide : styles.narrow}>
      {href && !off ? (
        <Link href={href} asChild>
          {pressable}
        </Link>
      ) : (
        pressable
      )}
      {hint ? (
        <Txt id={hintId} variant="small" tone="soft">
          {hint}
        </Txt>
      ) : null}
    </View>
  );
}

const styles = StyleSheet.create({
  box: {
    minHeight: touch,
    paddingHorizontal: space.two,
    paddingVertical: space.one,
    borderRadius: radius.control,
    borderWidth: 1.5,
    flexDirection: 'row',
    gap: space.one,
    alignItems: 'center',
    justifyContent: 'center',
  },
  // In line with the words above and below it.
  quiet: { paddingHorizontal: 0, borderWidth: 0, minWidth: 24 },
  underline: { position: 'absolute', left: 0, right: 0, bottom: 9, height: 1 },
  narrow: { alignSelf: 'flex-start', gap: space.half },
  wide: { alignSelf: 'stretch', gap: space.half },
});
