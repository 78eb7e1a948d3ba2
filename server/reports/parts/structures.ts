import type { CaseFile } from '../../../shared/case/caseFile';
import type { BreachInput, CrestPoint, StructureInput } from '../../../shared/case/structures';
import { formatDuration, formatNumber } from '../../../shared/units/format';
import type { UnitSystem } from '../../../shared/units/units';
import { hydrograph } from '../charts/hydrograph';
import { figure } from '../pdf/figure';
import type { Sheet } from '../pdf/sheet';
import { facts as factRows } from '../pdf/table';
import { heading, note } from '../pdf/writing';
import { unitsOf } from '../words';

type Unit = ReturnType<typeof unitsOf>;

/** The reservoir at the head of the reach, and what stands in the water. Nothing where there is neither. */
export function structures(
  sheet: Sheet,
  { structures: built, upstream }: CaseFile,
  system: UnitSystem,
) {
  const unit = unitsOf(system);
  if (upstream.kind === 'reservoir') {
    const { inflow, initialStage, stages, volumes, spillway } = upstream;
    heading(sheet, 'Reservoir');
    factRows(sheet, [
      ['Water at the start', unit(initialStage, 'elevation')],
      ['Storage curve from', `${unit(stages[0], 'elevation')}, ${unit(volumes[0], 'volume')}`],
      [
        'Storage curve to',
        `${unit(stages[stages.length - 1], 'elevation')}, ${unit(volumes[volumes.length - 1], 'volume')}`,
      ],
      ['Spillway', spillway ? `up to ${unit(Math.max(...spillway.flows), 'flow')}` : 'none given'],
    ]);
    const top = Math.max(...inflow.flows);
    const series = { times: inflow.times, values: inflow.flows };
    const peak = { value: top, time: inflow.times[inflow.flows.indexOf(top)] };
    if (inflow.times.length > 1)
      figure(sheet, [hydrograph('Inflow to the reservoir', series, peak, 'flow', system)], 160, '');
  }
  for (const structure of built) {
    heading(sheet, `${nameOf(structure)} ${structure.id}`);
    factRows(sheet, [
      ['Chainage', unit(structure.chainage, 'chainage')],
      ...measuresOf(structure, unit),
    ]);
  }
  if (built.some(({ kind }) => kind === 'breach'))
    note(
      sheet,
      'How a dam breaks is the least certain input of all: published regressions of width and time scatter by a factor of two and more about what happened (T. L. Wahl 2004, J. Hydraul. Eng. 130(5), 389–397).',
    );
}

type Rows = (readonly [string, string])[];

function nameOf({ kind }: StructureInput): string {
  if (kind === 'breach') return 'Failing dam';
  return kind.charAt(0).toUpperCase() + kind.slice(1);
}

/** What is told of each kind; of one without words of its own, where its measures stand. */
function measuresOf(structure: StructureInput, unit: Unit): Rows {
  if (structure.kind === 'breach')
    return [crestRow(structure, unit), ...breachRows(structure, unit)];
  if (structure.kind === 'weir')
    return [crestRow(structure, unit), ['Crest', structure.form === 'broad' ? 'broad' : 'sharp']];
  return [['Measures', 'as in the case file of this hash']];
}

const crestRow = ({ crest }: { crest: CrestPoint[] }, unit: Unit) =>
  ['Lowest crest', unit(Math.min(...crest.map(([, level]) => level)), 'elevation')] as const;

function breachRows(breach: BreachInput, unit: Unit): Rows {
  const { bottomLevel, bottomWidth, formationTime, mode, sideSlope, trigger } = breach;
  return [
    [
      'Begins',
      trigger.kind === 'time'
        ? `${formatDuration(trigger.time)} from start`
        : `when the water above it stands at ${unit(trigger.stage, 'elevation')}`,
    ],
    ['Mode', mode],
    [
      'Full breach',
      `${unit(bottomWidth, 'length')} wide at ${unit(bottomLevel, 'elevation')}, sides ${formatNumber(sideSlope, 2)} horizontal to 1 vertical`,
    ],
    ['Formation time', formationTime === 0 ? 'at once' : formatDuration(formationTime)],
  ];
}
