import { useMemo } from 'react';
import { StyleSheet, View } from 'react-native';
import { PictureProvider } from '@/components/charts/picture/pictureContext';
import { ReachRibbon } from '@/components/charts/ReachRibbon';
import { usePlace, usePlaceAndTimeStore } from '@/components/charts/usePlaceAndTime';
import { Cautions } from '@/components/layout/Cautions';
import { space } from '@/components/theme/tokens';
import { useBreakpoint } from '@/components/theme/useBreakpoint';
import { Button } from '@/components/ui/Button';
import { formatDay } from '@/components/ui/formatDay';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { IssuedResult } from '@/shared/review/types';
import type { Study } from '@/shared/studies/types';
import { ConfirmRead } from './ConfirmRead';
import { IssuedCurves } from './IssuedCurves';
import { IssuedTable } from './IssuedTable';
import { nearestStation } from './issuedWords';
import { StationWords } from './StationWords';

interface Props {
  study: Study;
  result: IssuedResult;
  isClient: boolean;
}

/** The flood at the places that the engineer chose: the figure that matters first, then the curve behind it. */
export function IssuedFlood({ study, result, isClient }: Props) {
  const { isWide } = useBreakpoint();
  const unitSystem = useUnitSystem();
  const store = usePlaceAndTimeStore();
  const at = usePlace(store);
  const station = nearestStation(result.stations, at);
  const { sections, stations, startsAt, hazardGuideline, signedAt, signedBy, qualification } =
    result;
  const source = useMemo(
    () => ({
      stem: result.title,
      foot: [result.title, `By ${signedBy}, ${formatDay(signedAt)}. Signed.`],
      ending: 'signed',
    }),
    [result.title, signedBy, signedAt],
  );
  return (
    <>
      {sections.length && station ? (
        <ReachRibbon
          sections={sections}
          stations={stations}
          restAt={stations.map(({ chainage }) => chainage)}
          at={station.chainage}
          onChange={store.setAt}
          unitSystem={unitSystem}
        />
      ) : null}
      {station ? (
        <View style={isWide ? styles.wide : styles.phone}>
          <View style={isWide ? styles.words : null}>
            <StationWords station={station} startsAt={startsAt} guideline={hazardGuideline} />
          </View>
          <View style={isWide ? styles.curves : styles.phone}>
            <PictureProvider value={source}>
              <IssuedCurves key={station.stationId} {...{ station, startsAt, store }} />
            </PictureProvider>
          </View>
        </View>
      ) : (
        <Txt>No station was chosen for this result; the report holds all of it.</Txt>
      )}
      {station ? (
        <IssuedTable
          stations={stations}
          chosen={station.stationId}
          onChoose={store.setAt}
          guideline={hazardGuideline}
        />
      ) : null}
      <Txt tone="soft">{`Signed ${formatDay(signedAt)} by ${signedBy}, ${qualification}. Stages are above ${study.verticalDatum}.`}</Txt>
      <View>
        <Button label="Print this page" onPress={() => window.print()} />
      </View>
      {isClient ? <ConfirmRead studyId={study.id} result={result} /> : null}
      <Cautions />
    </>
  );
}

const styles = StyleSheet.create({
  wide: { flexDirection: 'row', gap: space.four, alignItems: 'flex-start' },
  words: { flex: 2, minWidth: 0 },
  curves: { flex: 3, minWidth: 0, gap: space.two },
  phone: { gap: space.two },
});
