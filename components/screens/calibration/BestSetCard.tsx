import { Card } from '@/components/ui/Card';
import { Notice } from '@/components/ui/Notice';
import { Table } from '@/components/ui/Table';
import { Txt } from '@/components/ui/Txt';
import { useUnitSystem } from '@/components/ui/unitSystem';
import type { SearchResult, SearchSettings } from '@/shared/calibration/search/types';
import { formatNumber, formatWithUnit } from '@/shared/units/format';
import { rangeWords } from './flatnessWords';
import { PART_WORDS, stretchName, stretchPlace } from './stretchWords';

/** The multipliers that fit best, with how far each may move before the fit is a tenth worse. */
export function BestSetCard({
  settings,
  result,
}: {
  settings: SearchSettings;
  result: SearchResult;
}) {
  const system = useUnitSystem();
  const { best, before, why, flatness, evaluations } = result;
  const rows = settings.stretches.map((stretch, i) => ({
    stretch,
    factor: best.factors[i],
    flat: flatness[i],
  }));
  const failed = evaluations.filter(({ failure }) => failure !== null).length;
  return (
    <Card title="Best multipliers of Manning’s n">
      <Table
        label="Best multipliers"
        rows={rows}
        rowKey={({ stretch }) => `${stretchName(stretch)} ${stretch.from} ${stretch.part}`}
        columns={[
          { key: 'name', title: 'Stretch', render: ({ stretch }) => stretchName(stretch) },
          {
            key: 'best',
            title: 'Best',
            unit: '× n',
            align: 'right',
            render: ({ factor }) => formatNumber(factor, 2),
          },
          {
            key: 'range',
            title: 'As good as the best',
            align: 'right',
            render: ({ flat }) => rangeWords(flat),
          },
          {
            key: 'bounds',
            title: 'Bounds',
            align: 'right',
            render: ({ stretch: { low, high } }) => `${low} to ${high}`,
          },
          {
            key: 'place',
            title: 'Chainage',
            render: ({ stretch }) => stretchPlace(stretch, system),
          },
          { key: 'part', title: 'Part', render: ({ stretch }) => PART_WORDS[stretch.part] },
        ]}
      />
      <Txt>
        {`Misfit ${formatNumber(best.misfit, 2)}, before ${before.misfit === null ? '–' : formatNumber(before.misfit, 2)}. `}
        {why === 'settled'
          ? 'The search settled: nearby multipliers fit no better.'
          : 'The search stopped at its limit of runs before it had settled; more may still fit better.'}
      </Txt>
      {rows
        .filter(({ flat }) => flat.atBound)
        .map(({ stretch, flat }) => (
          <Notice key={stretchName(stretch)} tone="attention" still>
            {`${stretchName(stretch)} ended on its ${flat.atBound === 'low' ? 'lower' : 'upper'} bound: the fit wanted to go further. Ask whether something else is wrong before you widen it.`}
          </Notice>
        ))}
      <Txt variant="small" tone="soft">
        {`Simplex of Nelder and Mead (1965) within the bounds, in the logarithm of the multipliers, on cells of ${formatWithUnit(settings.cells.search, 'length', system)}${settings.cells.search === settings.cells.run ? ', those of the run' : `; those of the run are ${formatWithUnit(settings.cells.run, 'length', system)}`}. `}
        As good as the best is a misfit at most a tenth, or a tenth of the tolerance, above it.{' '}
        {failed > 0 ? `${failed} of the runs failed and were taken for no fit.` : ''}
      </Txt>
    </Card>
  );
}
