import { router } from 'expo-router';
import { StyleSheet } from 'react-native';
import { useCurrentStudy } from '@/components/layout/studyContext';
import { Button } from '@/components/ui/Button';
import { Card } from '@/components/ui/Card';
import { Empty } from '@/components/ui/Empty';
import { Table, type Column } from '@/components/ui/Table';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { SurveyRevisionRow } from '@/shared/surveys/types';
import { formatQuantity } from '@/shared/units/format';
import { UNITS, type UnitSystem } from '@/shared/units/units';
import { wallClock } from '@/components/ui/wallClock';
import { decisionWords } from './decisionWords';

/** What was handed in without faults, the newest first; a press shows the sections of that revision. */
export function RevisionsCard({ revisions }: { revisions: readonly SurveyRevisionRow[] }) {
  const { study, may } = useCurrentStudy();
  const system = useUnitSystem();
  return (
    <Card
      title="Handed in"
      aside={revisions.length > 1 ? `${revisions.length} revisions` : undefined}
    >
      {revisions.length === 0 ? (
        <Empty title="No survey yet">
          {may('survey.send')
            ? 'Choose the spreadsheet of cross-sections. It is read and shown to you before anything is kept.'
            : 'As soon as the surveyor has handed in the cross-sections they stand here.'}
        </Empty>
      ) : (
        <Table
          label="Survey revisions"
          columns={columns(system)}
          rows={revisions}
          rowKey={({ id }) => id}
          onRowPress={({ id }) =>
            router.push({
              pathname: '/studies/[studyId]/survey',
              params: { studyId: String(study.id), revision: String(id) },
            })
          }
        />
      )}
      {revisions.length > 1 ? (
        <Button label="Compare two of them" href={`/studies/${study.id}/survey/compare`} />
      ) : null}
    </Card>
  );
}

const columns = (system: UnitSystem): Column<SurveyRevisionRow>[] => [
  { key: 'revision', title: 'Revision', render: ({ revision }) => `Revision ${revision}` },
  { key: 'standing', title: 'Standing', render: (row) => decisionWords(row) },
  { key: 'file', title: 'File', render: ({ fileName }) => fileName },
  {
    key: 'sections',
    title: 'Sections',
    align: 'right',
    render: ({ sectionCount }) => sectionCount,
  },
  {
    key: 'points',
    title: 'Points',
    align: 'right',
    render: ({ pointCount }) => pointCount.toLocaleString('en-GB'),
  },
  {
    key: 'reach',
    title: 'Chainage',
    unit: UNITS[system].chainage.symbol,
    align: 'right',
    render: ({ firstChainage, lastChainage }) =>
      `${formatQuantity(firstChainage, 'chainage', system)} – ${formatQuantity(lastChainage, 'chainage', system)}`,
  },
  { key: 'by', title: 'Sent by', render: ({ sentBy }) => sentBy },
  { key: 'on', title: 'Sent', render: ({ sentAt }) => wallClock(sentAt) },
  {
    key: 'note',
    title: 'Note',
    render: ({ note }) => <Txt style={styles.note}>{note || '–'}</Txt>,
  },
];

const styles = StyleSheet.create({ note: { width: 240 } });
