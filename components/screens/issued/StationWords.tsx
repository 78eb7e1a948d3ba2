import { StyleSheet, View } from 'react-native';
import { space } from '@/components/theme/tokens';
import { Notice } from '@/components/ui/Notice';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { IssuedStation } from '@/shared/review/types';
import { formatQuantity, formatWithUnit } from '@/shared/units/format';
import { UNITS } from '@/shared/units/units';
import { floodSentence, freeboardSentence, hazardTone } from './issuedWords';

interface Props {
  station: IssuedStation;
  startsAt: string | null;
  guideline: string;
}

/** Peak and arrival in large type, and how dangerous it gets in the guideline's own words. */
export function StationWords({ station, startsAt, guideline }: Props) {
  const system = useUnitSystem();
  const { name, chainage, peakStage, peakFlow, depth, hazard, levels, times } = station;
  const deepest = depth.reduce((most, value) => Math.max(most, value), 0);
  return (
    <View role="region" aria-label={name} style={styles.block}>
      <View>
        <Txt variant="lead" strong heading={2}>
          {`${name} `}
          <Txt variant="lead" tone="soft">
            {formatWithUnit(chainage, 'chainage', system)}
          </Txt>
        </Txt>
        <Txt variant="display" strong tone="water">
          {formatQuantity(peakStage, 'elevation', system)}
          <Txt variant="title" tone="soft">
            {`\u00a0${UNITS[system].elevation.symbol} at the peak`}
          </Txt>
        </Txt>
        <Txt tone="soft">
          {`${formatWithUnit(deepest, 'depth', system)} deep at most, ${formatWithUnit(peakFlow, 'flow', system)} at most`}
        </Txt>
      </View>
      <Txt variant="lead" aria-live="polite">
        {floodSentence(station, startsAt).map(({ text, strong }, i) => (
          <Txt key={i} variant="lead" strong={strong}>
            {text}
          </Txt>
        ))}
      </Txt>
      {levels.map((result, k) => (
        <Notice key={k} tone={result.freeboard < 0 ? 'danger' : 'info'} still>
          <Txt>{freeboardSentence(result, times[times.length - 1] - times[0], system)}</Txt>
        </Notice>
      ))}
      {hazard ? (
        <Notice tone={hazardTone(hazard.label)} still>
          <Txt variant="lead" tone={hazardTone(hazard.label) === 'danger' ? 'brick' : 'ink'}>
            <Txt variant="lead" strong>
              {hazard.label}
            </Txt>
            {` · ${hazard.meaning}`}
          </Txt>
          <Txt variant="small">
            {`Class by depth and velocity over the whole flood, ${guideline}`}
          </Txt>
        </Notice>
      ) : null}
    </View>
  );
}

const styles = StyleSheet.create({ block: { gap: space.two } });
