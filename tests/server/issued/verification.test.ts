import { readCode, makeCode, showCode } from '../../../server/services/review/verificationCode';
import { aboveBanks } from '../../../server/services/issued/readIssued';
import { startTestServer, type TestServer } from '../../helpers/testServer';
import { buildChecked, sendAnswered, sign } from '../review/buildChecked';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer({ WORKERS: '0', TRUST_PROXY: '1' });
});
afterAll(() => server.stop());

const look = (code: string, address = '192.0.2.1') =>
  server.request.get(`/api/verification/${code}`).set('X-Forwarded-For', address);

test('codes are read as people write them', () => {
  const code = makeCode();
  expect(showCode(code)).toMatch(/^.{4}-.{4}-.{4}-.{4}$/);
  expect(readCode(showCode(code))).toBe(code);
  expect(readCode('o1il-0000 0000-000z')).toBe('01110000000000' + '0Z');
  expect(readCode('0000')).toBeNull();
  expect(readCode('0000-0000-0000-000U')).toBeNull();
});

test('a code tells the signature and no more, without an account', async () => {
  const checked = await buildChecked(server);
  await sendAnswered(checked);
  const { signOff } = await sign(server, checked);
  const code = signOff!.verificationCode;
  const { body } = await look(code.toLowerCase()).expect(200);
  expect(body).toEqual({
    standing: 'signed',
    signedBy: checked.people.senior.name,
    qualification: 'Chartered Engineer',
    firmName: expect.stringMatching(/^Firm /),
    signedAt: signOff!.at,
    withdrawnAt: null,
    supersededAt: null,
    reportHash: body.reportHash,
    reportHashes: body.reportHashes,
  });
  const base = `/api/runs/${checked.run.id}/review`;
  await checked.asSenior.post(`${base}/withdraw`).send({ reason: 'Wrong.' }).expect(200);
  const after = (await look(code).expect(200)).body;
  expect(after).toMatchObject({ standing: 'withdrawn', signedBy: body.signedBy });
  expect(JSON.stringify(after)).not.toContain('Wrong.');
});

test('guessing: no answer comes sooner, and after ten misses an address waits', async () => {
  const address = '192.0.2.9';
  const began = Date.now();
  for (let i = 0; i < 10; i++) await look(makeCode(), address).expect(404);
  expect(Date.now() - began).toBeGreaterThanOrEqual(10 * 195);
  await look(makeCode(), address).expect(429);
  await look(makeCode(), '192.0.2.10').expect(404);
});

test('within the banks again: from the last time above them on', () => {
  const times = [0, 1, 2, 3, 4, 5];
  expect(aboveBanks(times, [0, 2, 0, 2, 0, 0], 1, 2)).toEqual({
    leavesBanks: true,
    withinBanksAgain: 4,
  });
  expect(aboveBanks(times, [0, 0, 0, 0, 0, 0], 1, 0)).toEqual({
    leavesBanks: false,
    withinBanksAgain: null,
  });
  expect(aboveBanks(times, [0, 0, 2, 2, 2, 2], 1, 2)).toEqual({
    leavesBanks: true,
    withinBanksAgain: null,
  });
});
