import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { Screen } from '@/components/layout/Screen';
import { useCurrentStudy } from '@/components/layout/studyContext';
import { space } from '@/components/theme/tokens';
import { useBreakpoint } from '@/components/theme/useBreakpoint';
import { Button } from '@/components/ui/Button';
import { ErrorState } from '@/components/ui/ErrorState';
import { Loading } from '@/components/ui/Loading';
import { Txt } from '@/components/ui/Txt';
import type { SurveyReading } from '@/shared/surveys/types';
import { AcceptCard } from './AcceptCard';
import { countFaults } from './faultPlace';
import { FaultList } from './FaultList';
import { FileButton } from './FileButton';
import { FaultsDownload } from './FaultsDownload';
import { refuses } from './handInState';
import { MatchCard } from './MatchCard';
import { SectionsPreview } from './SectionsPreview';
import { TransferCard } from './TransferCard';
import type { HandInControl } from './useHandIn';

/** What was read of a file: its faults, or its sections and the button that takes them in. */
export function HandInScreen({ control }: { control: HandInControl }) {
  const { study } = useCurrentStudy();
  const { state } = control;
  const [note, setNote] = useState('');
  const { isWide } = useBreakpoint();
  if (state.step === 'choose' || state.step === 'accepted') return null;

  const reading =
    state.step === 'read' ? state.reading : state.step === 'reading' ? state.previous : null;
  const refused = reading !== null && refuses(reading);
  const busy = state.step === 'reading';
  const choice = state.step === 'unread' ? null : state.choice;
  const match =
    reading && choice ? (
      <MatchCard {...{ reading, choice, busy }} onChange={control.changeMatch} />
    ) : null;
  const another = (
    <FileButton
      label={refused ? 'Choose the mended file' : 'Choose another file'}
      kind={refused ? 'solid' : 'outline'}
      onFile={control.choose}
    />
  );
  // Read again with another match the faults are others.
  const asSpreadsheet = refused ? (
    <FaultsDownload
      key={JSON.stringify(choice)}
      file={state.file}
      match={state.step === 'read' && state.changed ? choice : null}
    />
  ) : null;
  const back = (
    <View style={styles.back}>
      <Button label="Back to the survey" kind="quiet" onPress={control.startAgain} />
    </View>
  );
  return (
    <Screen
      title={control.transfer ? 'Sending the survey' : titleOf(reading, state.step)}
      crumbs={[{ label: study.title, href: `/studies/${study.id}` }, { label: 'Survey' }]}
      lead={reading ? leadOf(state.file.name, reading) : state.file.name}
      actions={
        isWide ? (
          <>
            {back}
            {asSpreadsheet}
            {another}
          </>
        ) : undefined
      }
      footer={
        refused && !isWide ? (
          <View style={styles.footer}>
            {another}
            {asSpreadsheet}
          </View>
        ) : undefined
      }
      side={
        reading || !isWide ? (
          <>
            {refused ? match : null}
            {reading && !refused ? (
              <AcceptCard
                {...{ note, busy }}
                sending={control.isSending}
                error={control.sendError}
                onNote={setNote}
                onAccept={() => void control.handIn(note)}
              />
            ) : null}
            {isWide || refused ? null : another}
            {isWide ? null : back}
          </>
        ) : undefined
      }
    >
      {busy && !reading && control.transfer ? (
        <TransferCard fileName={state.file.name} transfer={control.transfer} />
      ) : null}
      {busy && !reading && !control.transfer ? (
        <Loading what={`Reading ${state.file.name}…`} />
      ) : null}
      {state.step === 'unread' ? (
        <ErrorState
          title={`${state.file.name} could not be read`}
          error={state.error}
          retry={control.readAgain}
        />
      ) : null}
      {reading && reading.faults.length > 0 ? (
        <FaultList
          label={refused ? 'Faults' : 'Doubts'}
          faults={reading.faults}
          notListed={reading.faultsNotListed}
        />
      ) : null}
      {reading && !refused ? (
        <>
          {reading.sections.length > 0 ? <SectionsPreview sections={reading.sections} /> : null}
          {match}
        </>
      ) : null}
    </Screen>
  );
}

function titleOf(reading: SurveyReading | null, step: string): string {
  if (!reading) return step === 'unread' ? 'Not read' : 'Reading the survey';
  const count = countFaults(reading.faults, reading.faultsNotListed);
  if (refuses(reading)) return `Not taken in: ${count}`;
  return reading.faults.length > 0 ? `Read, with ${count}` : 'Read without faults';
}

function leadOf(fileName: string, reading: SurveyReading) {
  const read = `${fileName} · ${reading.sectionCount} sections, ${reading.pointCount.toLocaleString('en-GB')} points read.`;
  return (
    <Txt tone="soft" role="status">
      {refuses(reading)
        ? `${read} Nothing of it was kept. Mend these and send it again.`
        : `${read} Nothing is kept yet: look it over and take it in.`}
    </Txt>
  );
}

const styles = StyleSheet.create({
  footer: { gap: space.one },
  back: { flexDirection: 'row', justifyContent: 'center' },
});
