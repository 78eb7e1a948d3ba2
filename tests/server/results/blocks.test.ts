import { gunzipSync } from 'node:zlib';
import { decodeColumns, encodeColumns } from '../../../server/results/blocks/columnsBlock';
import { evenly } from '../../../server/results/blocks/evenly';
import { recordWave } from '../../../server/results/blocks/waveRecorder';
import { sampleBlocks, sampleCase, sampleResult } from './sampleRun';
import { mergePlaces } from '../../../server/results/blocks/mergePlaces';

describe('a block of columns', () => {
  const columns = {
    a: Float64Array.of(0.1, -0, NaN, Number.MIN_VALUE, 1e308),
    b: Float32Array.of(1.5, 2.25, 3),
    empty: new Float64Array(0),
    c: Int32Array.of(-1, 7),
    long: Float64Array.from({ length: 500 }, (_, k) => (k === 7 ? NaN : Math.sin(k / 9) * 1e-3)),
    flow: Float32Array.from(
      { length: 333 },
      (_, k) => -1e6 + 1e3 * Math.exp(-((k - 99) ** 2) / 50),
    ),
    index: Int32Array.from({ length: 40 }, (_, k) => (k % 3) - 1),
  };

  test('comes back as it was, to the bit', () => {
    const back = decodeColumns<typeof columns>(encodeColumns(columns));
    expect(Object.keys(back)).toEqual(Object.keys(columns));
    for (const name of Object.keys(columns) as (keyof typeof columns)[]) {
      expect(back[name].constructor).toBe(columns[name].constructor);
      expect(Buffer.from(back[name].buffer, back[name].byteOffset, back[name].byteLength)).toEqual(
        Buffer.from(columns[name].buffer),
      );
    }
  });

  test('is read from any offset in memory', () => {
    const block = encodeColumns(columns);
    const shifted = new Uint8Array(block.length + 3);
    shifted.set(block, 3);
    expect(decodeColumns<typeof columns>(shifted.subarray(3)).b).toEqual(columns.b);
  });

  test('is refused where it is cut short or something else', () => {
    const block = encodeColumns(columns);
    expect(() => decodeColumns(block.subarray(0, block.length - 16))).toThrow('cut short');
    expect(() => decodeColumns(Buffer.from('something else'))).toThrow('Not a block');
    expect(() => decodeColumns(new Uint8Array(3))).toThrow('Not a block');
  });
});

describe('thinning', () => {
  test.each([
    [1, 5],
    [2, 5],
    [5, 5],
    [577, 600],
    [1001, 600],
    [20_000, 1000],
  ])('of %d by at most %d keeps both ends and grows', (count, limit) => {
    const kept = evenly(count, limit);
    expect(kept.length).toBe(Math.min(count, limit));
    expect(kept[0]).toBe(0);
    expect(kept[kept.length - 1]).toBe(count - 1);
    expect(kept.every((k, i) => i === 0 || k > kept[i - 1])).toBe(true);
    const gaps = Array.from(kept.slice(1), (k, i) => k - kept[i]);
    if (gaps.length > 0) expect(Math.max(...gaps) - Math.min(...gaps)).toBeLessThanOrEqual(1);
  });
  test('of nothing is nothing', () => expect(evenly(0, 5)).toHaveLength(0));
});

describe('places', () => {
  test('are sections and cells in one line; a section wins over a cell at the same chainage', () => {
    const caseFile = sampleCase();
    const result = sampleResult(caseFile, 125);
    // The middle of cell 50 moved onto the second section.
    result.cells.chainage[50] = 1000;
    const places = mergePlaces(caseFile.sections, result);
    expect(places.chainage).toHaveLength(125 + 3 - 1);
    expect(Array.from(places.section).filter((s) => s >= 0)).toEqual([0, 1, 2]);
    expect(Array.from(places.chainage).filter((x) => x === 1000)).toHaveLength(1);
    expect(Array.from(places.cell)).not.toContain(50);
    expect(Array.from(places.chainage)).toEqual(Array.from(places.chainage).sort((a, b) => a - b));
  });

  test('have their banks on straight lines between the surveyed ones', () => {
    const caseFile = sampleCase();
    const places = mergePlaces(caseFile.sections, sampleResult(caseFile, 100));
    places.chainage.forEach((x, i) => {
      expect(places.leftBank[i]).toBeCloseTo(54 - x / 1000, 9);
      expect(places.rightBank[i]).toBeCloseTo(54.5 - x / 1000, 9);
    });
  });
});

describe('the blocks of a run', () => {
  test('hold the series of a section exactly', async () => {
    const { blocks, result } = sampleBlocks();
    const series = await blocks.series(1);
    expect(Array.from(series.stage)).toEqual(result.sections[1].stage);
    expect(Array.from(series.froude)).toEqual(result.sections[1].froude);
  });

  test('stay small however many cells there are', async () => {
    const { encoded, blocks } = sampleBlocks(4000, 12.5);
    const stored = encoded.reduce((sum, { bytes }) => sum + bytes.length, 0);
    expect(stored).toBeLessThan(12e6);
    const places = await blocks.places();
    const kept = Array.from(places.wave).filter((w) => w >= 0);
    expect(kept).toEqual(kept.map((_, k) => k));
    expect(kept.length).toBeLessThanOrEqual(1003);
    for (const { bytes } of encoded) expect(gunzipSync(bytes).length).toBeLessThan(4e6);
  });

  test('keep the wave at a cell to single precision of depth', async () => {
    const { blocks, result } = sampleBlocks();
    const places = await blocks.places();
    const place = Array.from(places.section).findIndex((s, i) => s < 0 && i > 40);
    const [row] = await blocks.wave([places.wave[place]]);
    const cell = result.cells.chainage.indexOf(places.chainage[place]);
    expect(cell).toBeGreaterThan(0);
    expect(row.depth).toHaveLength(result.times.length);
    row.depth.forEach((d) => expect(d).toBeLessThan(3.0000003));
    expect(places.bed[place] + row.depth[row.depth.length - 1]).toBeCloseTo(
      result.cells.finalStage[cell],
      6,
    );
  });

  test('are not made where outputs are missing', () => {
    const wave = recordWave(10);
    const values = new Float64Array(4);
    wave.add({ index: 0, time: 0, stage: values, flow: values, velocity: values });
    expect(() => wave.finish()).toThrow('1 of 10');
  });
});
