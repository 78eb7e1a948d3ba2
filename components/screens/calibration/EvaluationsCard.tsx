import { useState } from 'react';
import { Button } from '@/components/ui/Button';
import { Card } from '@/components/ui/Card';
import { Table, type Column } from '@/components/ui/Table';
import type { Evaluation, SearchResult, SearchSettings } from '@/shared/calibration/search/types';
import { formatNumber } from '@/shared/units/format';
import { stretchName } from './stretchWords';

const PURPOSE: Record<Evaluation['purpose'], string> = {
  before: 'as the run',
  search: 'search',
  flatness: 'flatness',
};

/** Every run of the search, one press away. */
export function EvaluationsCard({
  settings,
  result,
}: {
  settings: SearchSettings;
  result: SearchResult;
}) {
  const [isShown, setShown] = useState(false);
  const { evaluations, best } = result;
  const columns: Column<Evaluation>[] = [
    {
      key: 'number',
      title: 'Run',
      render: ({ number, purpose }) => `${number}, ${PURPOSE[purpose]}`,
    },
    {
      key: 'misfit',
      title: 'Misfit',
      align: 'right',
      render: ({ misfit, failure }) =>
        misfit === null ? (failure ? 'failed' : '–') : formatNumber(misfit, 3),
    },
    ...settings.stretches.map((stretch, i): Column<Evaluation> => ({
      key: String(i),
      title: stretchName(stretch),
      unit: '× n',
      align: 'right',
      render: ({ factors }) => formatNumber(factors[i], 3),
    })),
  ];
  return (
    <Card
      title="Every run of the search"
      aside={
        <Button
          kind="quiet"
          label={isShown ? 'Hide them' : `Show all ${evaluations.length}`}
          name={
            isShown
              ? 'Hide them, the runs of the search'
              : `Show all ${evaluations.length} runs of the search`
          }
          onPress={() => setShown(!isShown)}
        />
      }
    >
      {isShown ? (
        <Table
          label="Runs of the search"
          rows={evaluations}
          rowKey={({ number }) => number}
          isChosen={({ misfit }) => misfit === best.misfit}
          columns={columns}
          maxHeight={480}
        />
      ) : null}
    </Card>
  );
}
