import { Link } from 'expo-router';
import { Pressable, StyleSheet, View } from 'react-native';
import { useBreakpoint } from '@/components/theme/useBreakpoint';
import { hairline, space } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/useTheme';
import { Badge } from '@/components/ui/Badge';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { RunRow } from '@/shared/runs/types';
import { formatWithUnit } from '@/shared/units/format';
import { runBadge } from '../check/reviewWords';
import { wallClock } from '@/components/ui/wallClock';
import { timeLeftWords } from './runWords';

/** One run in the list: what was routed, how far it is, what came out furthest downstream. */
export function RunEntry({ run, studyId }: { run: RunRow; studyId: number }) {
  const { colours } = useTheme();
  const { isWide } = useBreakpoint();
  const unitSystem = useUnitSystem();
  const found =
    run.peakStage === null || run.peakFlow === null
      ? null
      : `${formatWithUnit(run.peakStage, 'elevation', unitSystem)}, ${formatWithUnit(run.peakFlow, 'flow', unitSystem)}`;
  const words = found ? 'peak at the outlet' : runLeftWords(run);
  return (
    <View role="listitem" style={[styles.item, { borderTopColor: colours.line }]}>
      <Link href={`/studies/${studyId}/runs/${run.id}`} asChild>
        <Pressable role="link" style={isWide ? styles.wide : styles.phone}>
          <View style={isWide ? styles.column : null}>
            <Txt variant="lead" strong>{`Run ${run.number}, ${run.scenarioName}`}</Txt>
            <Txt variant="small" tone="soft">
              {`Asked for by ${run.requestedBy}, ${wallClock(run.requestedAt)}`}
            </Txt>
          </View>
          {isWide || words ? (
            <View style={isWide ? styles.column : null}>
              {found ? <Txt strong>{found}</Txt> : null}
              {words ? (
                <Txt variant="small" tone="soft">
                  {words}
                </Txt>
              ) : null}
            </View>
          ) : null}
          <View style={isWide ? styles.state : null}>
            <Badge {...runBadge(run)} />
          </View>
        </Pressable>
      </Link>
    </View>
  );
}

const runLeftWords = ({ state, secondsLeft }: RunRow) =>
  state === 'running' ? timeLeftWords(secondsLeft) : null;

const styles = StyleSheet.create({
  item: { borderTopWidth: hairline },
  wide: { flexDirection: 'row', alignItems: 'center', gap: space.two, paddingVertical: space.two },
  phone: { gap: space.one, paddingVertical: space.two },
  column: { flex: 1 },
  state: { width: 150 },
});
