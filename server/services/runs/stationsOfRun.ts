import type { Station } from '../../../shared/studies/types';
import type { Models } from '../../models';
import type { RunModel } from '../../models/Run';
import { readSignedRecord } from '../review/readSignedRecord';

/** The stations that a run is read at: of a signed run those that its signature fixed, else those of today. */
export function buildStationsOfRun(models: Models, today: (studyId: number) => Promise<Station[]>) {
  /** null before the signature. */
  async function signedStations({ id: runId }: RunModel) {
    const signed = await readSignedRecord(models, runId);
    return signed && { at: signed.at.toISOString(), stations: signed.record.stations };
  }

  const stationsOf = async (run: RunModel): Promise<Station[]> =>
    (await signedStations(run))?.stations ?? today(run.studyId);

  return { signedStations, stationsOf };
}
