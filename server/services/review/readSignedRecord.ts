import { unpackJson } from '../../database/packedJson';
import type { Models } from '../../models';
import type { SignedRecord } from './signedRecord';

/** When a run was signed, and what the signature fixed; null before it. */
export async function readSignedRecord(
  { SignOff }: Pick<Models, 'SignOff'>,
  runId: number,
): Promise<{ at: Date; record: SignedRecord } | null> {
  const signed = await SignOff.scope('withRecord').findOne({
    where: { runId },
    attributes: ['at', 'record'],
  });
  return signed && { at: signed.at, record: await unpackJson<SignedRecord>(signed.record) };
}
