import { useState } from 'react';
import { useCurrentStudy } from '@/components/layout/studyContext';
import { Card } from '@/components/ui/Card';
import { Table } from '@/components/ui/Table';
import { Txt } from '@/components/ui/Txt';
import { toleranceSource } from '@/shared/calibration/marks';
import type { Mark } from '@/shared/calibration/types';
import { markColumns } from './markColumns';
import { MarkDialog } from './MarkDialog';

interface Props {
  marks: Mark[];
  /** Chosen place, m. */
  at: number | null;
  onChoose: (chainage: number) => void;
}

export function MarksCard({ marks, at, onChoose }: Props) {
  const { study, may } = useCurrentStudy();
  const [changing, setChanging] = useState<Mark | null>(null);
  const mayChange = may('scenario.change');
  const floods = [...new Set(marks.map(({ flood }) => flood))];
  return (
    <Card title="Marks" aside={String(marks.length)}>
      <Table
        label="Marks"
        columns={markColumns<Mark>(study.unitSystem)}
        rows={marks}
        rowKey={({ id }) => id}
        isChosen={({ chainage }) => chainage === at}
        onRowPress={(mark) => {
          onChoose(mark.chainage);
          if (mayChange) setChanging(mark);
        }}
        maxHeight={420}
      />
      <Txt variant="small" tone="soft">
        {`${mayChange ? 'Choose one to change or remove it. ' : ''}${toleranceSource(study.unitSystem)}`}
      </Txt>
      {changing ? (
        <MarkDialog mark={changing} floods={floods} onClose={() => setChanging(null)} />
      ) : null}
    </Card>
  );
}
