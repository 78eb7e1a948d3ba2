import { gaugeRecordAt } from '../../../shared/calibration/gaugeRecordAt';
import { observedLevels } from '../../../shared/calibration/observedLevels';
import { HAZARD_CLASSES, HAZARD_GUIDELINE } from '../../../shared/hazard/hazardClass';
import { levelName } from '../../../shared/studies/stationLevels';
import { formatDuration, formatNumber } from '../../../shared/units/format';
import { arrivalRule } from '../../../shared/runs/arrivalRule';
import { sayIn } from '../../../shared/units/message';
import { hydrograph } from '../charts/hydrograph';
import { longSection } from '../charts/longSection';
import { figure } from '../pdf/figure';
import type { Sheet } from '../pdf/sheet';
import { table } from '../pdf/table';
import { heading, note, partHeading } from '../pdf/writing';
import type { PlaceResult, RunReport } from '../runReport';
import { momentText, unitsOf } from '../words';

/** The long section, the hydrographs, and every number of them. */
export function results(sheet: Sheet, report: RunReport): void {
  const { facts, surface, sections, places, placesAreStations, run } = report;
  const { observed, study } = facts;
  const { unitSystem } = study;
  partHeading(sheet, 'Results', 'newPage');
  figure(
    sheet,
    [
      longSection({
        chainages: surface.chainages,
        bed: surface.bed,
        leftBank: surface.leftBank,
        rightBank: surface.rightBank,
        peakStage: surface.peakStage,
        startStage: surface.stage.subarray(0, surface.places),
        stations: places.map(({ name, peaks }) => ({ name, chainage: peaks.chainage })),
        observed: observed ? observedLevels(observed) : [],
        system: unitSystem,
        alt: `Long section: bed, banks, the water at the start and the highest water at every place${observed?.marks.length ? ', with the marks that were observed' : ''}.`,
      }),
    ],
    250,
    'The highest water at every place, whenever it was reached: an envelope, at no moment the surface of the river.' +
      (observed?.marks.length
        ? ` Crosses: marks of the flood ${observed.flood || 'without a name'}, each with its tolerance.`
        : ''),
  );
  heading(sheet, placesAreStations ? 'At the stations' : 'At the first, middle and last section');
  peakTable(sheet, report, places, placesAreStations ? 'Station' : 'Section');
  levelTable(sheet, report);
  for (const { name, peaks, series } of places)
    figure(
      sheet,
      [
        hydrograph(
          name,
          { times: series.times, values: series.stage },
          { value: peaks.peakStage, time: peaks.peakStageTime },
          'elevation',
          unitSystem,
          gaugeRecordAt(observed, peaks.chainage, 'stage'),
        ),
        hydrograph(
          name,
          { times: series.times, values: series.flow },
          { value: peaks.peakFlow, time: peaks.peakFlowTime },
          'flow',
          unitSystem,
          gaugeRecordAt(observed, peaks.chainage, 'flow'),
        ),
      ],
      146,
      '',
    );
  heading(sheet, 'At the surveyed sections');
  peakTable(sheet, report, sections, 'Section');
  const { startsAt } = facts.run;
  note(
    sheet,
    `Times from the start of the run${startsAt ? `, ${momentText(startsAt)}` : ''}. Arrival: ${sayIn(facts.study.unitSystem, arrivalRule(run.arrivalThreshold))}`,
  );
  hazardWords(sheet, [...places, ...sections]);
}

function peakTable(
  sheet: Sheet,
  { facts }: RunReport,
  rows: readonly PlaceResult[],
  what: string,
): void {
  const unit = unitsOf(facts.study.unitSystem);
  table(
    sheet,
    [
      { heading: what, share: 2.4 },
      { heading: 'Chainage', share: 1.9, align: 'right' },
      { heading: 'Highest water', share: 1.8, align: 'right' },
      { heading: 'Depth', share: 1.6, align: 'right' },
      { heading: 'Flow', share: 2.1, align: 'right' },
      { heading: 'Velocity', share: 1.8, align: 'right' },
      { heading: 'Arrives', share: 2.2, align: 'right' },
      { heading: 'Highest at', share: 2.2, align: 'right' },
      { heading: 'Flow lost', share: 1.3, align: 'right' },
      { heading: 'Hazard', share: 1.5 },
    ],
    rows.map(({ name, peaks, hazard }) => [
      name,
      unit(peaks.chainage, 'chainage'),
      unit(peaks.peakStage, 'elevation'),
      unit(peaks.peakDepth, 'depth'),
      unit(peaks.peakFlow, 'flow'),
      unit(peaks.peakVelocity, 'velocity'),
      peaks.arrival === null ? 'never' : formatDuration(peaks.arrival),
      formatDuration(peaks.peakStageTime),
      peaks.attenuation === null ? '–' : `${formatNumber(100 * peaks.attenuation, 1)} %`,
      hazard?.label ?? 'dry',
    ]),
  );
}

/** Freeboard of what was named at the stations. */
function levelTable(sheet: Sheet, { facts, levels }: RunReport): void {
  if (levels.length === 0) return;
  const unit = unitsOf(facts.study.unitSystem);
  heading(sheet, 'Levels at the stations');
  table(
    sheet,
    [
      { heading: 'Station', share: 2.4 },
      { heading: 'Level of', share: 3.2 },
      { heading: 'Level', share: 1.8, align: 'right' },
      { heading: 'Highest water', share: 1.8, align: 'right' },
      { heading: 'Freeboard', share: 1.8, align: 'right' },
      { heading: 'Passed at', share: 1.8, align: 'right' },
      { heading: 'Passed for', share: 1.8, align: 'right' },
    ],
    levels.map((result) => [
      result.name,
      levelName(result),
      unit(result.level, 'elevation'),
      unit(result.peakStage, 'elevation'),
      unit(result.freeboard, 'depth'),
      result.passedAt === null ? 'never' : formatDuration(result.passedAt),
      result.passedAt === null ? '–' : formatDuration(result.passedFor),
    ]),
  );
  note(
    sheet,
    'Freeboard is the level less the highest water; where it is below zero the water stands above the level. The water ' +
      'surface is level across a section: at a bridge or a house it can stand higher by velocity head, waves or blockage.',
  );
}

/** The letters alone mean nothing: other authorities use the same for other limits. */
function hazardWords(sheet: Sheet, places: readonly PlaceResult[]): void {
  const present = new Set(places.map(({ hazard }) => hazard?.label));
  heading(sheet, 'Hazard classes');
  table(
    sheet,
    [
      { heading: 'Class', share: 1 },
      { heading: 'Meaning by the guideline', share: 7 },
    ],
    HAZARD_CLASSES.filter(({ label }) => present.has(label)).map(({ label, meaning }) => [
      label,
      meaning,
    ]),
  );
  note(
    sheet,
    `By ${HAZARD_GUIDELINE}: the worst class over time, from the depth at the lowest point of the section and the mean ` +
      'velocity of the same moment. On the floodplain beside the channel it is usually lower. The rules of the local authority go first.',
  );
}
