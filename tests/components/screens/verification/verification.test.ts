import { createHash } from 'node:crypto';
import { sha256 } from '@/components/screens/verification/sha256';
import { isTheVeryOne, standing } from '@/components/screens/verification/verificationWords';
import type { Verification } from '@/shared/review/types';

const bytes = (text: string) => Uint8Array.from(Buffer.from(text, 'latin1'));

// Source: NIST, "Examples with Intermediate Values, SHA-256" (one block, two blocks), and FIPS 180-4 for the empty message.
test.each([
  ['', 'e3b0c44298fc1c149afbf4c8996fb92427ae41e4649b934ca495991b7852b855'],
  ['abc', 'ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad'],
  [
    'abcdbcdecdefdefgefghfghighijhijkijkljklmklmnlmnomnopnopq',
    '248d6a61d20638b8e5c026930c3e6039a33ce45964ff2167f6ecedd419db06c1',
  ],
])('the hash of %j is the published one', (text, hash) => {
  expect(sha256(bytes(text))).toBe(hash);
});

test('every length about a block agrees with the hash of the platform', () => {
  for (const length of [1, 54, 55, 56, 57, 63, 64, 65, 119, 120, 128, 100_003]) {
    const message = Uint8Array.from({ length }, (_, i) => (i * 131 + 7) & 255);
    expect(sha256(message)).toBe(createHash('sha256').update(message).digest('hex'));
  }
});

const found: Verification = {
  standing: 'issued',
  signedBy: 'Rurik Tesk',
  qualification: 'Chartered engineer',
  firmName: 'Pyke Morrow Hydraulics',
  signedAt: '2025-11-14T12:00:00Z',
  withdrawnAt: null,
  supersededAt: null,
  reportHash: 'aa',
  reportHashes: ['aa', 'bb'],
};

test('a file is the very one on either paper, and no other', () => {
  expect(isTheVeryOne('aa', found)).toBe(true);
  expect(isTheVeryOne('BB', found)).toBe(true);
  expect(isTheVeryOne('ab', found)).toBe(false);
  expect(isTheVeryOne('aa', { reportHash: null, reportHashes: [] })).toBeNull();
});

test('a signature that no longer stands is said so first', () => {
  expect(standing(found).tone).toBe('done');
  const withdrawn = standing({
    ...found,
    standing: 'withdrawn',
    withdrawnAt: '2025-11-20T12:00:00Z',
  });
  expect(withdrawn.tone).toBe('danger');
  expect(withdrawn.title).toBe('The signature was withdrawn on 20 Nov 2025');
  expect(standing({ ...found, standing: 'superseded' }).tone).toBe('attention');
});
