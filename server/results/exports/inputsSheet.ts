import type { CaseFile } from '../../../shared/case/caseFile';
import { CASE_DEFAULTS } from '../../../shared/case/caseFile';
import { formatDuration } from '../../../shared/units/format';
import type { RunFacts } from '../blocks/blockTypes';
import type { ExportedRun } from './exportedRun';
import { EXPORT_UNITS } from './exportUnits';

type Row = (string | number | null)[];

/** What went in: where the numbers come from, the conditions at the ends, and the tables as they were frozen. */
export function inputsSheet(run: ExportedRun, caseFile: CaseFile, facts: RunFacts): Row[] {
  const { length, flow } = EXPORT_UNITS[run.unitSystem];
  const { numerics, sections } = caseFile;
  const rows: Row[] = [
    ['Study', run.studyTitle],
    ['Scenario', run.scenarioName],
    ['Run', run.number],
    ['Requested by', run.requestedBy],
    ['Finished', run.finishedAt],
    ['Start of the run (UTC)', run.startsAt ?? 'no clock time'],
    ['Vertical datum', run.verticalDatum || 'not stated'],
    ['Case', run.caseHash],
    ['Solver version', run.solverVersion],
    [],
    ['Surveyed sections', sections.length],
    [`First chainage (${length.symbol})`, sections[0].chainage / length.si],
    [`Last chainage (${length.symbol})`, sections[sections.length - 1].chainage / length.si],
    ['Cells', facts.cellCount],
    [`Cell size (${length.symbol})`, facts.cellSize / length.si],
    ['Duration', formatDuration(numerics.duration)],
    ['Output interval (s)', numerics.outputInterval],
    ['Order', numerics.order ?? CASE_DEFAULTS.order],
    ['Courant number', numerics.courant ?? CASE_DEFAULTS.courant],
    [`Dry depth (${length.symbol})`, (numerics.dryDepth ?? CASE_DEFAULTS.dryDepth) / length.si],
    ['Gravity (m/s2)', caseFile.gravity ?? CASE_DEFAULTS.gravity],
    [],
    ['Upstream end', UPSTREAM_WORDS[caseFile.upstream.kind]],
    ['Outlet', OUTLET_WORDS[caseFile.downstream.kind]],
    ...(caseFile.downstream.kind === 'normalDepth' ? [['Slope', caseFile.downstream.slope]] : []),
    ['Initial state', INITIAL_WORDS[caseFile.initial.kind]],
    ['Lateral inflows', caseFile.laterals.length],
  ];

  const stage = { title: `stage (${length.symbol})`, si: length.si };
  const discharge = { title: `flow (${flow.symbol})`, si: flow.si };
  const seconds = { title: 'time (s)', si: 1 };
  const table = (title: string, columns: { title: string; si: number; values: number[] }[]) => {
    rows.push([], [title], ['', ...columns.map((c) => c.title)]);
    columns[0].values.forEach((_, k) => rows.push(['', ...columns.map((c) => c.values[k] / c.si)]));
  };

  const { upstream, downstream, initial } = caseFile;
  if (upstream.kind === 'inflow') {
    table('Inflow', [
      { ...seconds, values: upstream.times },
      { ...discharge, values: upstream.flows },
    ]);
  }
  if (upstream.kind === 'stage') {
    table('Upstream stage', [
      { ...seconds, values: upstream.times },
      { ...stage, values: upstream.stages },
    ]);
  }
  if (downstream.kind === 'stage') {
    table('Outlet stage', [
      { ...seconds, values: downstream.times },
      { ...stage, values: downstream.stages },
    ]);
  }
  if (downstream.kind === 'rating') {
    table('Outlet rating curve', [
      { ...stage, values: downstream.stages },
      { ...discharge, values: downstream.flows },
    ]);
  }
  caseFile.laterals.forEach(({ from, to, times, flows }, k) => {
    const ends = [from, to].map((x) => x / length.si).join(' to ');
    table(`Lateral inflow ${k + 1}, chainage ${ends} ${length.symbol}`, [
      { ...seconds, values: times },
      { ...discharge, values: flows },
    ]);
  });
  if (initial.kind === 'still') {
    rows.push([], [`Still water at (${length.symbol})`, initial.stage / length.si]);
  }
  if (initial.kind === 'dam') {
    const level = (z: number | null) => (z === null ? 'dry' : z / length.si);
    rows.push(
      [],
      [`Dam at chainage (${length.symbol})`, initial.chainage / length.si],
      [`Stage above the dam (${length.symbol})`, level(initial.stageAbove)],
      [`Stage below the dam (${length.symbol})`, level(initial.stageBelow)],
    );
  }
  if (initial.kind === 'profile') {
    table('Initial profile', [
      { title: `chainage (${length.symbol})`, si: length.si, values: initial.chainages },
      { ...stage, values: initial.stages },
      { ...discharge, values: initial.flows },
    ]);
  }
  return rows;
}

const UPSTREAM_WORDS: Record<CaseFile['upstream']['kind'], string> = {
  inflow: 'Inflow hydrograph',
  stage: 'Stage against time',
  reservoir: 'Reservoir',
  wall: 'Closed',
};
const OUTLET_WORDS: Record<CaseFile['downstream']['kind'], string> = {
  normalDepth: 'Normal depth',
  stage: 'Stage against time',
  rating: 'Rating curve',
  criticalDepth: 'Critical depth (free overfall)',
  open: 'Open, waves leave',
  wall: 'Closed',
};
const INITIAL_WORDS: Record<CaseFile['initial']['kind'], string> = {
  steady: 'Steady flow for the first inflow and outlet state',
  still: 'Still water',
  profile: 'Given profile',
  dam: 'Water behind a dam that fails at the start',
};
