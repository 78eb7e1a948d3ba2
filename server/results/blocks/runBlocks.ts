import { promisify } from 'node:util';
import { gunzip } from 'node:zlib';
import {
  WAVE_LIMITS,
  type BlockKind,
  type PlaceColumns,
  type ReservoirColumns,
  type RunFacts,
  type SeriesColumns,
  type StructureColumns,
  type WaveColumns,
} from './blockTypes';
import { decodeColumns } from './columnsBlock';

const unzip = promisify(gunzip);

/** The stored bytes (gzip) of the named parts of a kind, in the order asked; throws where one is missing. */
export type ReadBlocks = (kind: BlockKind, parts: number[]) => Promise<Uint8Array[]>;

/** The results of one routed run, read block by block as they are needed. */
export interface RunBlocks {
  facts(): Promise<RunFacts>;
  places(): Promise<PlaceColumns>;
  series(section: number): Promise<SeriesColumns>;
  /** Of several sections, read at once. */
  seriesOf(sections: number[]): Promise<SeriesColumns[]>;
  structure(part: number): Promise<StructureColumns>;
  reservoir(): Promise<ReservoirColumns>;
  /** Depth, flow and velocity at the given places of the wave, each over all moments. */
  wave(places: number[]): Promise<WaveRow[]>;
}

export type WaveRow = Record<keyof WaveColumns, Float32Array>;

export function runBlocks(read: ReadBlocks): RunBlocks {
  const one = async (kind: BlockKind, part: number) => unzip((await read(kind, [part]))[0]);
  const seriesOf = async (sections: number[]) => {
    const stored = await read('series', sections);
    return Promise.all(
      stored.map(async (bytes) => decodeColumns<SeriesColumns>(await unzip(bytes))),
    );
  };
  const facts = once(async () => JSON.parse((await one('facts', 0)).toString('utf8')) as RunFacts);

  return {
    facts,
    places: once(async () => decodeColumns<PlaceColumns>(await one('places', 0))),
    series: async (section) => (await seriesOf([section]))[0],
    seriesOf,
    structure: async (part) => decodeColumns(await one('structure', part)) as StructureColumns,
    reservoir: async () => decodeColumns<ReservoirColumns>(await one('reservoir', 0)),
    async wave(places) {
      const partOf = (place: number) => Math.floor(place / WAVE_LIMITS.placesPerPart);
      const parts = [...new Set(places.map(partOf))];
      const stored = await read('wave', parts);
      const raw = await Promise.all(stored.map((bytes) => unzip(bytes)));
      const decoded = new Map(parts.map((part, k) => [part, decodeColumns<WaveColumns>(raw[k])]));
      const count = (await facts()).moments.length;
      return places.map((place) => {
        const part = decoded.get(partOf(place))!;
        const from = (place % WAVE_LIMITS.placesPerPart) * count;
        const row = (values: Float32Array) => values.subarray(from, from + count);
        return { depth: row(part.depth), flow: row(part.flow), velocity: row(part.velocity) };
      });
    },
  };
}

function once<T>(make: () => Promise<T>): () => Promise<T> {
  let made: Promise<T> | undefined;
  return () => (made ??= make());
}
