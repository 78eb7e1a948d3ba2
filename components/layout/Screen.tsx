import { useRef, type ReactNode } from 'react';
import { ScrollView, StyleSheet, View, type Text } from 'react-native';
import { PictureProvider, type PictureSource } from '@/components/charts/picture/pictureContext';
import { hairline, space, widths } from '../theme/tokens';
import { useBreakpoint } from '../theme/useBreakpoint';
import { useTheme } from '../theme/useTheme';
import { StretchedButtons } from '../ui/stretchedButtons';
import { Txt } from '../ui/Txt';
import { Crumbs, type Crumb } from './Crumbs';
import { useDocumentTitle, useHeadingFocus } from './screenEffects';

interface ScreenProps {
  title: string;
  crumbs?: readonly Crumb[];
  /** State beside the title. */
  badge?: ReactNode;
  /** Buttons of the screen: beside the title on wide; on a phone within thumb reach, or below the work where the foot is taken. */
  actions?: ReactNode;
  /** A sentence under the title. */
  lead?: ReactNode;
  /** The reach ribbon. */
  ribbon?: ReactNode;
  children?: ReactNode;
  /** Beside the work on wide, after it on a phone. */
  side?: ReactNode;
  /** Stays within thumb reach at the bottom: the time ribbon. */
  footer?: ReactNode;
  /** Keeps forms and prose to a readable width. */
  narrow?: boolean;
  /** Where its drawings come from: each then offers a picture of itself. */
  picture?: PictureSource | null;
}

/** Every screen: where one is, what it is, the work, and what to do next. */
export function Screen(props: ScreenProps) {
  const { title, crumbs, badge, actions, lead, ribbon, children, side, footer } = props;
  const { narrow, picture = null } = props;
  const { isWide } = useBreakpoint();
  const { colours } = useTheme();
  const heading = useRef<Text>(null);
  useDocumentTitle(title);
  useHeadingFocus(heading);

  return (
    <View role="main" style={styles.screen}>
      <ScrollView
        style={styles.scroll}
        contentContainerStyle={[styles.content, isWide ? styles.contentWide : styles.contentPhone]}
      >
        <View style={styles.head}>
          <View style={styles.names}>
            {crumbs ? <Crumbs crumbs={crumbs} /> : null}
            <View style={styles.titleRow}>
              <Txt
                ref={heading}
                variant="title"
                strong
                heading={1}
                style={styles.title}
                {...{ tabIndex: -1, dataSet: { spateHeading: '' } }}
              >
                {title}
              </Txt>
              {badge}
            </View>
            {typeof lead === 'string' ? (
              <Txt tone="soft" style={styles.lead}>
                {lead}
              </Txt>
            ) : (
              lead
            )}
          </View>
          {isWide && actions ? <View style={styles.actions}>{actions}</View> : null}
        </View>
        {ribbon}
        <PictureProvider value={picture}>
          <View style={isWide && side ? styles.columns : styles.stack}>
            <View
              style={[
                styles.work,
                isWide && side ? styles.workBeside : null,
                narrow ? styles.narrow : null,
              ]}
            >
              {children}
            </View>
            {side ? <View style={isWide ? styles.side : styles.work}>{side}</View> : null}
          </View>
        </PictureProvider>
        {!isWide && footer && actions ? <View style={styles.actionsPhone}>{actions}</View> : null}
      </ScrollView>
      {!isWide && !footer && actions ? (
        <StretchedButtons value>
          <View style={[styles.foot, { borderTopColor: colours.line }]}>{actions}</View>
        </StretchedButtons>
      ) : null}
      {footer ? (
        <View
          style={[
            isWide ? styles.footerWide : styles.footerPhone,
            { borderTopColor: colours.line, backgroundColor: colours.paper },
          ]}
        >
          {footer}
        </View>
      ) : null}
    </View>
  );
}

const styles = StyleSheet.create({
  screen: { flex: 1, minWidth: 0 },
  scroll: { flex: 1 },
  content: { flexGrow: 1, gap: space.two },
  contentWide: { padding: space.three },
  contentPhone: { padding: space.two, paddingBottom: space.three },
  head: {
    flexDirection: 'row',
    gap: space.two,
    justifyContent: 'space-between',
    alignItems: 'flex-end',
  },
  names: { flexShrink: 1, flexGrow: 1, gap: space.half / 2, minWidth: 0 },
  titleRow: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    columnGap: space.two,
    rowGap: space.half,
    alignItems: 'center',
  },
  title: { flexShrink: 1 },
  lead: { maxWidth: widths.prose },
  actions: { flexDirection: 'row', gap: space.one, flexShrink: 0 },
  actionsPhone: { flexDirection: 'row', flexWrap: 'wrap', gap: space.one, paddingTop: space.one },
  foot: {
    gap: space.one,
    paddingHorizontal: space.two,
    paddingVertical: space.one * 1.5,
    borderTopWidth: hairline,
  },
  columns: { flexDirection: 'row', gap: space.two, alignItems: 'flex-start', flexGrow: 1 },
  stack: { gap: space.two },
  work: { gap: space.two, minWidth: 0 },
  workBeside: { flex: 1 },
  narrow: { maxWidth: widths.form, width: '100%' },
  side: { width: widths.side, gap: space.two },
  footerWide: { paddingHorizontal: space.three, paddingVertical: space.one },
  footerPhone: {
    paddingHorizontal: space.two,
    paddingVertical: space.one,
    borderTopWidth: hairline,
  },
});
