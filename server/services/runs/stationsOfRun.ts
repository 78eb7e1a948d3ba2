import type { Station } from '../../../shared/studies/types';
import { unpackJson } from '../../database/packedJson';
import type { Models } from '../../models';
import type { RunModel } from '../../models/Run';
import type { SignedRecord } from '../review/signedRecord';

/** The stations that a run is read at: of a signed run those that its signature fixed, else those of today. */
export function buildStationsOfRun(
  { SignOff }: Models,
  today: (studyId: number) => Promise<Station[]>,
) {
  /** null before the signature. */
  async function signedStations({ id: runId }: RunModel) {
    const signed = await SignOff.scope('withRecord').findOne({
      where: { runId },
      attributes: ['at', 'record'],
    });
    if (!signed) return null;
    const { stations } = await unpackJson<SignedRecord>(signed.record);
    return { at: signed.at.toISOString(), stations };
  }

  const stationsOf = async (run: RunModel): Promise<Station[]> =>
    (await signedStations(run))?.stations ?? today(run.studyId);

  return { signedStations, stationsOf };
}
