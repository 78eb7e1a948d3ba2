import { decodeSurface, encodeSurface } from '../../../shared/runs/surfaceBlock';
import { inflowPeak } from '../../../server/results/inflowPeak';
import { peaksAt } from '../../../server/results/peaksAt';
import { seriesAlong, seriesAt } from '../../../server/results/seriesAt';
import { summaryOf } from '../../../server/results/summaryOf';
import { surfaceOf } from '../../../server/results/surfaceOf';
import { bankLevels } from '../../../server/results/bankLevels';
import { depthAt, flowAt, sampleBlocks, sampleCase } from './sampleRun';

describe('series at a chainage', () => {
  test('is the exact one at a surveyed section', async () => {
    const { blocks, result } = sampleBlocks();
    const series = (await seriesAt(blocks, 1000))!;
    expect(series.sectionId).toBe('=XS-02');
    expect(series.times).toEqual(result.times);
    expect(series.stage).toEqual(result.sections[1].stage);
    expect(series.flow).toEqual(result.sections[1].flow);
    expect(series.peaks.peakStage).toBe(result.sections[1].peak.stage);
  });

  test('is linear between the neighbouring cells elsewhere', async () => {
    const { blocks, reads } = sampleBlocks();
    // Cells of 25 m have their middles at 12.5, 37.5, …: 725 is half-way between 712.5 and 737.5.
    const series = (await seriesAt(blocks, 725))!;
    expect(series.sectionId).toBeNull();
    series.times.forEach((t, k) => {
      const depth = (depthAt(712.5, t) + depthAt(737.5, t)) / 2;
      expect(series.depth[k]).toBeCloseTo(depth, 6);
      expect(series.stage[k]).toBeCloseTo(50 - 0.725 + depth, 6);
      expect(series.flow[k]).toBeCloseTo((flowAt(712.5, t) + flowAt(737.5, t)) / 2, 5);
    });
    expect(reads.filter((read) => read.startsWith('wave')).length).toBeLessThanOrEqual(2);
  });

  test('reaches both ends of the reach and not beyond', async () => {
    const { blocks } = sampleBlocks();
    expect((await seriesAt(blocks, 0))?.sectionId).toBe('XS-01');
    expect((await seriesAt(blocks, 2500))?.sectionId).toBe('XS-03');
    expect((await seriesAt(blocks, 5))?.sectionId).toBeNull();
    expect(await seriesAt(blocks, -1)).toBeNull();
    expect(await seriesAt(blocks, 2501)).toBeNull();
  });
});

describe('along the reach', () => {
  test('many places are read at once, in their order, each as it is read alone', async () => {
    const { blocks, queries } = sampleBlocks();
    const asked = [725, 1000, -1, 5, 1000, 2500];
    const together = [];
    for await (const series of seriesAlong(blocks, asked)) together.push(series);
    const blocksOf = (kind: string) => queries.filter((query) => query.startsWith(kind));
    expect(blocksOf('series')).toEqual(['series/1,2']);
    expect(blocksOf('wave')).toHaveLength(1);
    for (const [k, chainage] of asked.entries())
      expect(together[k]).toEqual(await seriesAt(blocks, chainage));
  });
});

describe('peaks', () => {
  test('attenuation is the share of the inflow peak that is gone', async () => {
    const { blocks } = sampleBlocks();
    const peaks = peaksAt(await blocks.places(), { flow: 80, time: 0 }, 725)!;
    expect(peaks.attenuation).toBeCloseTo(0.25, 12);
    expect(peaksAt(await blocks.places(), null, 725)!.attenuation).toBeNull();
  });

  test('where the wave came to one of two cells only, the nearer one decides', async () => {
    const { blocks } = sampleBlocks();
    const places = await blocks.places();
    // It comes to the cell at 2387.5 and not to that at 2412.5.
    expect(peaksAt(places, null, 2390)!.arrival).toBeCloseTo(2387.5 / 2 + 600, 9);
    expect(peaksAt(places, null, 2410)!.arrival).toBeNull();
  });

  test('of the inflow are those within the run', () => {
    const inflow = (times: number[], flows: number[]) =>
      inflowPeak({ ...sampleCase(), upstream: { kind: 'inflow', times, flows } });
    expect(inflow([0, 1800, 7200], [10, 100, 10])).toEqual({ flow: 100, time: 1800 });
    expect(inflow([0, 14_400], [0, 200])).toEqual({ flow: 100, time: 7200 });
    expect(inflow([-3600, 3600], [50, 10])).toEqual({ flow: 30, time: 0 });
    expect(inflow([0], [7])).toEqual({ flow: 7, time: 0 });
    expect(inflowPeak({ ...sampleCase(), upstream: { kind: 'wall' } })).toBeNull();
  });
});

describe('summary', () => {
  test('lists every section and those stations that lie on the reach', async () => {
    const { blocks, result } = sampleBlocks();
    const summary = await summaryOf(9, blocks, [
      { id: 1, name: 'Mill', chainage: 725 },
      { id: 2, name: 'Far', chainage: 9000 },
    ]);
    expect(summary.runId).toBe(9);
    expect(summary.sections.map((s) => s.id)).toEqual(['XS-01', '=XS-02', 'XS-03']);
    expect(summary.sections[2].peakStageTime).toBe(result.sections[2].peak.stageTime);
    expect(summary.stations.map((s) => [s.stationId, s.name])).toEqual([[1, 'Mill']]);
    expect(summary.stations[0].peakStage).toBeCloseTo(50 - 0.725 + 3, 9);
    expect(summary.times).toEqual({ start: 0, end: 7200, interval: 60, count: 121 });
    expect(summary.inflowPeak).toEqual({ flow: 100, time: 1800 });
    expect(summary.cellCount).toBe(100);
    expect(summary.cellSize).toBe(25);
    expect(summary.warnings).toEqual(result.warnings);
    expect(summary.arrivalRule.message).toBe(result.arrivalThreshold.text);
  });
});

describe('surface', () => {
  test('keeps sections, ends, the first and the last moment, and comes through its block', async () => {
    const { blocks } = sampleBlocks();
    const surface = await surfaceOf(blocks, { places: 20, moments: 10 });
    expect(surface.places).toBe(20);
    expect(surface.moments).toBe(10);
    const chainages = Array.from(surface.chainages);
    for (const x of [0, 1000, 2500, 12.5, 2487.5]) expect(chainages).toContain(x);
    expect([surface.times[0], surface.times[9]]).toEqual([0, 7200]);
    surface.times.forEach((t, m) =>
      chainages.forEach((x, p) => {
        const at = m * surface.places + p;
        expect(surface.stage[at]).toBeCloseTo(50 - x / 1000 + depthAt(x, t), 4);
        expect(surface.flow[at]).toBeCloseTo(flowAt(x, t), 4);
      }),
    );
    expect(decodeSurface(encodeSurface(surface))).toEqual(surface);
  });

  test('keeps all sections even where fewer places were asked for', async () => {
    const { blocks } = sampleBlocks();
    const surface = await surfaceOf(blocks, { places: 2, moments: 2 });
    expect(Array.from(surface.chainages)).toEqual([0, 1000, 2500]);
  });
});

describe('bank levels', () => {
  const section = (points: [number, number][], banks?: [number, number]) =>
    bankLevels({ id: 'a', chainage: 0, points, roughness: [[0, 0.03]], banks });
  test('are interpolated, and at a wall its top', () => {
    const points: [number, number][] = [
      [0, 10],
      [4, 6],
      [4, 2],
      [9, 2],
      [10, 8],
    ];
    expect(section(points, [2, 9.5])).toEqual({ left: 8, right: 5 });
    expect(section(points, [4, 10])).toEqual({ left: 6, right: 8 });
    expect(section(points)).toEqual({ left: 10, right: 8 });
  });
});
