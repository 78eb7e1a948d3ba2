import type { BreachInput, CrestPoint, StructureInput } from '../../../shared/case/structures';
import { formatDuration, formatNumber } from '../../../shared/units/format';
import type { RunStructure } from '../../../shared/runs/types';
import {
  CULVERT_INLET_WORDS,
  PIER_WORDS,
  REGIME_WORDS,
  STRUCTURE_NAMES,
} from '../../../shared/structures/structureWords';
import { hydrograph } from '../charts/hydrograph';
import { figure } from '../pdf/figure';
import type { Sheet } from '../pdf/sheet';
import { facts as factRows } from '../pdf/table';
import { heading, note } from '../pdf/writing';
import type { RunReport } from '../runReport';
import { timeText, unitsOf } from '../words';

type Unit = ReturnType<typeof unitsOf>;

/** The reservoir at the head of the reach, and what stands in the water. Nothing where there is neither. */
export function structures(
  sheet: Sheet,
  { facts, caseFile, run }: Pick<RunReport, 'facts' | 'caseFile' | 'run'>,
) {
  const { structures: built, upstream } = caseFile;
  const system = facts.study.unitSystem;
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
    heading(sheet, `${STRUCTURE_NAMES[structure.kind]} ${structure.id}`);
    factRows(sheet, [
      ['Chainage', unit(structure.chainage, 'chainage')],
      ...measuresOf(structure, unit),
      ...routedOf(run.structures?.find(isOf(structure)), unit, (time) => timeText(time, facts)),
    ]);
    if (structure.note) note(sheet, structure.note);
  }
  if (built.some(({ kind }) => kind === 'breach'))
    note(
      sheet,
      'How a dam breaks is the least certain input of all: published regressions of width and time scatter by a factor of two and more about what happened (T. L. Wahl 2004, J. Hydraul. Eng. 130(5), 389–397).',
    );
}

type Rows = (readonly [string, string])[];

const isOf =
  ({ id, kind }: StructureInput) =>
  (routed: RunStructure) =>
    routed.id === id && routed.kind === kind;

/** Changes of regime that are told one by one. */
const REGIMES_TOLD = 6;

/** What the run made of it; nothing before there is one. */
function routedOf(
  routed: RunStructure | undefined,
  unit: Unit,
  timeOf: (seconds: number) => string,
): Rows {
  if (!routed) return [];
  const { peak, regimes, breach } = routed;
  const told = regimes
    .slice(0, REGIMES_TOLD)
    .map(({ time, regime }, k) =>
      k === 0 ? REGIME_WORDS[regime] : `from ${timeOf(time)} ${REGIME_WORDS[regime]}`,
    );
  const rest = regimes.length - told.length;
  return [
    ['Greatest flow', `${unit(peak.flow, 'flow')} at ${timeOf(peak.flowTime)}`],
    ['Highest water above', `${unit(peak.stageUp, 'elevation')} at ${timeOf(peak.stageUpTime)}`],
    [
      'The water passes',
      told.join('; ') +
        (rest > 0 ? `; ${rest} more ${rest === 1 ? 'change' : 'changes'} as in the files` : ''),
    ],
    ...(breach
      ? ([
          [
            'The dam',
            breach.begins === null
              ? 'does not fail within the run'
              : `begins to fail at ${timeOf(breach.begins)}; at the end ${unit(breach.width, 'length')} wide at ${unit(breach.bottom, 'elevation')}`,
          ],
        ] as const)
      : []),
  ];
}

/** What is told of each kind. */
function measuresOf(structure: StructureInput, unit: Unit): Rows {
  switch (structure.kind) {
    case 'breach':
      return [crestRow(structure, unit), ...breachRows(structure, unit)];
    case 'weir':
      return [
        crestRow(structure, unit),
        ['Crest', structure.form],
        ...coefficientRow('Discharge coefficient', structure.coefficient),
      ];
    case 'sluice': {
      const { width, sill, openings, contraction } = structure;
      const [least, most] = [Math.min(...openings), Math.max(...openings)];
      return [
        ['Gates', `${unit(width, 'length')} wide, sill at ${unit(sill, 'elevation')}`],
        [
          'Opening',
          least === most
            ? unit(most, 'depth')
            : `${unit(least, 'depth')} to ${unit(most, 'depth')}, moved in time`,
        ],
        ...coefficientRow('Coefficient of contraction', contraction),
      ];
    }
    case 'culvert':
      return culvertRows(structure, unit);
    case 'bridge': {
      const { piers, obstructed, soffit, deck, contraction, deckCoefficient } = structure;
      return [
        ['Piers', `${PIER_WORDS[piers]}; ${formatNumber(obstructed * 100, 1)} % of the flow area`],
        ['Soffit', unit(soffit, 'elevation')],
        ...(deck ? [crestRow({ crest: deck }, unit, 'Lowest of the deck')] : []),
        ...coefficientRow('Coefficient of contraction', contraction),
        ...coefficientRow('Coefficient over the deck', deckCoefficient),
      ];
    }
  }
}

function culvertRows(culvert: Extract<StructureInput, { kind: 'culvert' }>, unit: Unit): Rows {
  const { barrels, inlet, n, length, invertUp, invertDown, crest, crestCoefficient } = culvert;
  const size =
    culvert.shape === 'circular'
      ? `of ${unit(culvert.diameter, 'depth')} diameter`
      : `of ${unit(culvert.width, 'depth')} by ${unit(culvert.height, 'depth')}`;
  return [
    ['Barrels', `${barrels} ${size}, ${unit(length, 'length')} long, n ${formatNumber(n, 3)}`],
    ['Inverts', `${unit(invertUp, 'elevation')} to ${unit(invertDown, 'elevation')}`],
    ['Inlet', CULVERT_INLET_WORDS[inlet]],
    ...(crest ? [crestRow({ crest }, unit, 'Lowest of the road')] : []),
    ...coefficientRow('Coefficient over the road', crestCoefficient),
  ];
}

const coefficientRow = (name: string, value: number | undefined): Rows =>
  value === undefined ? [] : [[name, formatNumber(value, 3)]];

const crestRow = ({ crest }: { crest: CrestPoint[] }, unit: Unit, name = 'Lowest crest') =>
  [name, unit(Math.min(...crest.map(([, level]) => level)), 'elevation')] as const;

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
