import { CASE_DEFAULTS, type CaseFile } from '../../../shared/case/caseFile';
import { formatDuration, formatNumber, formatSetting } from '../../../shared/units/format';
import { inflowOutline } from '../../results/inflowOutline';
import { hydrograph } from '../charts/hydrograph';
import { figure } from '../pdf/figure';
import type { Sheet } from '../pdf/sheet';
import { facts as factRows, table } from '../pdf/table';
import { heading, partHeading } from '../pdf/writing';
import type { RunReport } from '../runReport';
import { timeText, unitsOf } from '../words';
import { structures } from './structures';
import { momentumText, valley } from './valley';

type Unit = ReturnType<typeof unitsOf>;

/** What came down, what stood in its way, and how finely it was computed. */
export function scenario(sheet: Sheet, { facts, caseFile, run }: RunReport): void {
  const unit = unitsOf(facts.study.unitSystem);
  const { numerics, laterals } = caseFile;
  partHeading(sheet, 'Scenario', 'newPage');
  factRows(sheet, [
    ['Scenario', facts.run.scenarioName],
    ['Upstream end', upstreamText(caseFile)],
    ...(run.inflowPeak
      ? ([
          [
            'Greatest inflow',
            `${unit(run.inflowPeak.flow, 'flow')} at ${timeText(run.inflowPeak.time, facts)}`,
          ],
          ['Volume of inflow', unit(run.volume.inflow, 'volume')],
        ] as const)
      : []),
    ['Outlet', outletText(caseFile, unit)],
    ['Initial state', initialText(caseFile, unit)],
    ['Lateral inflows', laterals.length === 0 ? 'none' : String(laterals.length)],
    ...(caseFile.structures.length === 0
      ? ([['Structures', 'none: no bridge, culvert or weir is represented']] as const)
      : []),
  ]);
  const inflow = inflowOutline(caseFile);
  if (run.inflowPeak && inflow.times.length > 0)
    figure(
      sheet,
      [
        hydrograph(
          'Inflow at the upstream end',
          { times: inflow.times, values: inflow.flows },
          { value: run.inflowPeak.flow, time: run.inflowPeak.time },
          'flow',
          facts.study.unitSystem,
        ),
      ],
      180,
      'The inflow as it was routed.',
    );
  if (laterals.length > 0) {
    heading(sheet, 'Lateral inflows');
    table(
      sheet,
      [
        { heading: 'From', share: 2, align: 'right' },
        { heading: 'To', share: 2, align: 'right' },
        { heading: 'Greatest flow over the stretch', share: 3, align: 'right' },
      ],
      laterals.map(({ from, to, flows }) => [
        unit(from, 'chainage'),
        unit(to, 'chainage'),
        unit(Math.max(...flows), 'flow'),
      ]),
    );
  }
  valley(sheet, caseFile, unit);
  structures(sheet, { facts, caseFile, run });
  heading(sheet, 'Numerical settings');
  factRows(sheet, [
    ['Cells', `${formatNumber(run.cellCount, 0)} of ${unit(run.cellSize, 'length')}`],
    ['Duration', formatDuration(numerics.duration)],
    ['Output every', `${formatNumber(numerics.outputInterval, 0)} s`],
    ['Order in space and time', String(numerics.order ?? CASE_DEFAULTS.order)],
    ['Courant number', formatNumber(numerics.courant ?? CASE_DEFAULTS.courant, 2)],
    [
      'Dry depth',
      formatSetting(numerics.dryDepth ?? CASE_DEFAULTS.dryDepth, 'depth', facts.study.unitSystem),
    ],
    ['Momentum of the flow', momentumText(caseFile)],
    ['Time steps taken', formatNumber(run.steps, 0)],
  ]);
}

const UPSTREAM: Record<CaseFile['upstream']['kind'], string> = {
  inflow: 'inflow hydrograph',
  stage: 'stage against time',
  reservoir: 'reservoir',
  wall: 'closed',
};
const upstreamText = ({ upstream }: CaseFile) => UPSTREAM[upstream.kind];

const OUTLET: Record<CaseFile['downstream']['kind'], string> = {
  normalDepth: 'normal depth',
  stage: 'stage against time',
  rating: 'rating curve',
  criticalDepth: 'critical depth (free overfall)',
  open: 'open, waves leave',
  wall: 'closed',
};
function outletText({ downstream }: CaseFile, unit: Unit): string {
  const word = OUTLET[downstream.kind];
  return downstream.kind === 'normalDepth'
    ? `${word} on a slope of ${unit(downstream.slope, 'slope')}`
    : word;
}

function initialText({ initial }: CaseFile, unit: Unit): string {
  switch (initial.kind) {
    case 'steady':
      return 'steady flow for the first inflow and outlet state';
    case 'still':
      return `still water at ${unit(initial.stage, 'elevation')}`;
    case 'profile':
      return 'a given profile';
    case 'dam': {
      const level = (stage: number | null) =>
        stage === null ? 'dry' : `water at ${unit(stage, 'elevation')}`;
      return (
        `a dam at chainage ${unit(initial.chainage, 'chainage')} that is gone at the start: ` +
        `above it ${level(initial.stageAbove)}, below it ${level(initial.stageBelow)}`
      );
    }
  }
}
