import { useRef, type ReactNode } from 'react';
import { ScrollView, StyleSheet, View, type Text } from 'react-native';
import { useDocumentTitle, useHeadingFocus } from '@/components/layout/screenEffects';
import { Wordmark } from '@/components/layout/Wordmark';
import { space } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/useTheme';
import { Card } from '@/components/ui/Card';
import { Txt } from '@/components/ui/Txt';
import { FloodDrawing } from './FloodDrawing';

interface AuthPageProps {
  title: string;
  lead?: string;
  children: ReactNode;
  /** Below the card: other ways on. */
  after?: ReactNode;
}

/** One card on the ground of the page, a flood passing below it. */
export function AuthPage({ title, lead, children, after }: AuthPageProps) {
  const { colours } = useTheme();
  const heading = useRef<Text>(null);
  useDocumentTitle(title);
  useHeadingFocus(heading);
  return (
    <View style={[styles.page, { backgroundColor: colours.paper }]}>
      <FloodDrawing />
      <ScrollView contentContainerStyle={styles.centre}>
        <View role="main" style={styles.column}>
          <Wordmark />
          <Card style={styles.card}>
            <View style={styles.head}>
              <Txt
                ref={heading}
                variant="title"
                strong
                heading={1}
                {...{ tabIndex: -1, dataSet: { spateHeading: '' } }}
              >
                {title}
              </Txt>
              {lead ? <Txt tone="soft">{lead}</Txt> : null}
            </View>
            {children}
          </Card>
          {after ? <View style={styles.after}>{after}</View> : null}
        </View>
      </ScrollView>
    </View>
  );
}

const styles = StyleSheet.create({
  page: { flex: 1 },
  centre: {
    flexGrow: 1,
    justifyContent: 'center',
    alignItems: 'center',
    padding: space.two,
    paddingBottom: 160,
  },
  column: { width: '100%', maxWidth: 432, gap: space.three },
  card: { padding: space.three },
  head: { gap: space.half },
  after: { alignItems: 'flex-start', gap: space.one },
});
