import { gzipSync } from 'node:zlib';
import type { CaseFile } from '../../../shared/case/caseFile';
import type {
  ReservoirResult,
  ResultFile,
  SectionResult,
  StructureResult,
} from '../../../shared/case/resultFile';
import { REGIMES } from '../../../shared/structures/structureWords';
import { inflowPeak, releasePeak } from '../inflowPeak';
import { reservoirOf, structuresOf } from '../structuresOf';
import {
  WAVE_LIMITS,
  type BlockKind,
  type EncodedBlock,
  type PlaceColumns,
  type ReservoirColumns,
  type RunFacts,
  type SeriesColumns,
  type StructureColumns,
  type WaveColumns,
} from './blockTypes';
import { encodeColumns, type Columns } from './columnsBlock';
import { mergePlaces, type MergedPlaces } from './mergePlaces';
import type { RecordedWave } from './waveRecorder';

/** Level 6 gains 1 % over level 4 on these numbers and takes twice as long. */
const GZIP_LEVEL = 4;

/** The blocks of a routed run, as `blockTypes.ts` lays them out. */
export function encodeRun(
  caseFile: CaseFile,
  result: ResultFile,
  wave: RecordedWave,
): EncodedBlock[] {
  const merged = mergePlaces(caseFile.sections, result);
  const kept = placesOfWave(merged, wave);
  kept.forEach((place, k) => (merged.wave[place] = k));
  const { cell: _cell, ...places } = merged;
  return [
    block('facts', 0, Buffer.from(JSON.stringify(facts(caseFile, result, wave)))),
    columnsBlock('places', 0, places satisfies PlaceColumns),
    ...result.sections.map((section, part) => columnsBlock('series', part, seriesOf(section))),
    ...waveParts(merged, kept, result, wave),
    ...(result.structures ?? []).map((of, part) =>
      columnsBlock('structure', part, structureColumns(of)),
    ),
    ...(result.reservoir ? [columnsBlock('reservoir', 0, reservoirColumns(result.reservoir))] : []),
  ];
}

function block(kind: BlockKind, part: number, raw: Uint8Array): EncodedBlock {
  return { kind, part, bytes: gzipSync(raw, { level: GZIP_LEVEL }) };
}
const columnsBlock = (kind: BlockKind, part: number, columns: Columns) =>
  block(kind, part, encodeColumns(columns));

function facts(caseFile: CaseFile, result: ResultFile, wave: RecordedWave): RunFacts {
  const { sections } = caseFile;
  const cellCount = result.cells.chainage.length;
  const length = sections[sections.length - 1].chainage - sections[0].chainage;
  return {
    times: result.times,
    arrivalThreshold: result.arrivalThreshold,
    volume: result.volume,
    warnings: result.warnings,
    steps: result.steps,
    cellUpdates: result.cellUpdates,
    seconds: result.seconds,
    cellCount,
    cellSize: length / cellCount,
    inflowPeak: releasePeak(result) ?? inflowPeak(caseFile),
    sections: result.sections.map(({ id, chainage }) => ({ id, chainage })),
    structures: structuresOf(caseFile, result),
    reservoir: reservoirOf(result),
    moments: Array.from(wave.moments),
  };
}

function seriesOf(section: SectionResult): SeriesColumns {
  return {
    stage: Float64Array.from(section.stage),
    depth: Float64Array.from(section.depth),
    flow: Float64Array.from(section.flow),
    area: Float64Array.from(section.area),
    velocity: Float64Array.from(section.velocity),
    froude: Float64Array.from(section.froude),
  };
}

function structureColumns({ flow, stageUp, stageDown, regime, breach }: StructureResult) {
  return {
    flow: Float64Array.from(flow),
    stageUp: Float64Array.from(stageUp),
    stageDown: Float64Array.from(stageDown),
    regime: Int32Array.from(regime, (one) => REGIMES.indexOf(one)),
    ...(breach && {
      width: Float64Array.from(breach.width),
      bottom: Float64Array.from(breach.bottom),
    }),
  } satisfies StructureColumns;
}

const reservoirColumns = ({ stage, volume, inflow, release }: ReservoirResult) =>
  ({
    stage: Float64Array.from(stage),
    volume: Float64Array.from(volume),
    inflow: Float64Array.from(inflow),
    release: Float64Array.from(release),
  }) satisfies ReservoirColumns;

/** Indexes into the places of the surveyed sections and of the cells that were recorded. */
function placesOfWave(merged: MergedPlaces, wave: RecordedWave): number[] {
  const recorded = new Set(wave.cells);
  return Array.from(merged.chainage.keys()).filter(
    (i) => merged.section[i] >= 0 || recorded.has(merged.cell[i]),
  );
}

function waveParts(
  merged: MergedPlaces,
  kept: number[],
  result: ResultFile,
  wave: RecordedWave,
): EncodedBlock[] {
  const recordedAt = new Map(Array.from(wave.cells, (cell, k) => [cell, k]));
  const count = wave.moments.length;
  const parts: EncodedBlock[] = [];
  for (let first = 0; first < kept.length; first += WAVE_LIMITS.placesPerPart) {
    const group = kept.slice(first, first + WAVE_LIMITS.placesPerPart);
    const floats = () => new Float32Array(group.length * count);
    const part: WaveColumns = { depth: floats(), flow: floats(), velocity: floats() };
    group.forEach((place, g) => {
      const section = result.sections[merged.section[place]];
      const row = g * count;
      if (section) {
        wave.moments.forEach((output, m) => {
          part.depth[row + m] = section.depth[output];
          part.flow[row + m] = section.flow[output];
          part.velocity[row + m] = section.velocity[output];
        });
        return;
      }
      const from = (recordedAt.get(merged.cell[place]) ?? 0) * count;
      for (let m = 0; m < count; m++) {
        part.depth[row + m] = wave.stage[from + m] - merged.bed[place];
        part.flow[row + m] = wave.flow[from + m];
        part.velocity[row + m] = wave.velocity[from + m];
      }
    });
    parts.push(columnsBlock('wave', parts.length, part));
  }
  return parts;
}
