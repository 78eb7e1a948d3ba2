/**
 * How a running product answers its pages while it computes 500 members of a case of 2,000 cells:
 *   npx tsx tests/bench/membersUnderLoad.ts http://127.0.0.1:8080 [members]
 * Signs in with a demo account, routes a short flood on 2,000 cells of the demo reach, measures its pages idle, asks for the
 * ensemble, measures the same pages until the set has ended, and prints the medians and their ratio.
 */
import { DEMO_ACCOUNTS, DEMO_PASSWORD } from '../../seed/accounts';
import type { Run } from '../../shared/runs/types';
import type { Scenario } from '../../shared/scenarios/types';
import type { StudyRow } from '../../shared/studies/types';
import type { TaskSet } from '../../shared/tasks/types';

const [base = 'http://127.0.0.1:8080', members = '500'] = process.argv.slice(2);
const CELLS = 2000;
/** s of flood: a member is to take a good part of a second, not a minute. */
const DURATION = 900;
const LOOKS = 60;

let token = '';
async function call<T>(method: string, path: string, body?: unknown): Promise<T> {
  const response = await fetch(`${base}/api${path}`, {
    method,
    headers: {
      'Content-Type': 'application/json',
      Origin: base,
      ...(token && { Authorization: `Bearer ${token}` }),
    },
    body: body === undefined ? undefined : JSON.stringify(body),
  });
  const text = await response.text();
  if (!response.ok) throw new Error(`${method} ${path}: ${response.status} ${text}`);
  return (text ? JSON.parse(text) : null) as T;
}
const pause = (ms: number) => new Promise((resolve) => setTimeout(resolve, ms));
async function signIn(): Promise<void> {
  const { email } = DEMO_ACCOUNTS.find(({ roles }) => roles.includes('modeller'))!;
  const body = { email, password: DEMO_PASSWORD };
  token = (await call<{ accessToken: string }>('POST', '/auth/sign-in', body)).accessToken;
}

/** ms of one look at a page of a study and what it reads, one after the other. */
async function look(studyId: number, runId: number): Promise<number> {
  const began = performance.now();
  await (await fetch(`${base}/studies/${studyId}/runs/${runId}`)).text();
  for (const path of [
    '/me',
    `/studies/${studyId}`,
    `/studies/${studyId}/runs`,
    `/runs/${runId}`,
    `/runs/${runId}/summary`,
  ])
    await call('GET', path);
  return performance.now() - began;
}

const median = (values: number[]) => [...values].sort((a, b) => a - b)[values.length >> 1];
const share = (values: number[], p: number) =>
  [...values].sort((a, b) => a - b)[Math.floor(p * (values.length - 1))];

async function main(): Promise<void> {
  await signIn();
  const [study] = (await call<StudyRow[]>('GET', '/studies')).filter(({ title }) =>
    title.startsWith('Lower Veshall'),
  );
  const [first] = await call<{ id: number }[]>('GET', `/studies/${study.id}/scenarios`);
  const name = `2,000 cells ${Date.now()}`;
  const copy = await call<Scenario>('POST', `/scenarios/${first.id}/duplicate`, { name });
  const numerics = { cellSize: 21_400 / CELLS, duration: DURATION, outputInterval: 60 };
  const body = { ...copy.body, numerics: { ...copy.body.numerics, ...numerics } };
  await call('PUT', `/scenarios/${copy.id}`, { version: copy.version, body });
  let run = await call<Run>('POST', `/scenarios/${copy.id}/runs`);
  while (run.state === 'queued' || run.state === 'running') {
    await pause(500);
    run = await call<Run>('GET', `/runs/${run.id}`);
  }
  const { cells } = await call<{ cells: number }>('GET', `/runs/${run.id}/confidence`);
  console.log(`run ${run.number}: ${run.state}, ${cells} cells`);

  const idle: number[] = [];
  for (let k = 0; k < LOOKS; k++) {
    idle.push(await look(study.id, run.id));
    await pause(250);
  }
  let set = await call<TaskSet>('POST', `/runs/${run.id}/confidence/ensemble`, {
    members: Number(members),
    seed: 1,
    parameters: [
      { key: 'roughness', distribution: { kind: 'lognormal', median: 1, spread: 1.2 } },
      { key: 'peakFlow', distribution: { kind: 'normal', mean: 1, deviation: 0.1 } },
    ],
  });
  const began = Date.now();
  const loaded: number[] = [];
  while (set.state === 'queued' || set.state === 'running') {
    if (loaded.length % 200 === 199) await signIn();
    loaded.push(await look(study.id, run.id));
    await pause(500);
    set = await call<TaskSet>('GET', `/task-sets/${set.id}`);
  }
  const seconds = (Date.now() - began) / 1000;
  console.log(
    `${set.state}: ${set.finished} of ${set.total} members, ${set.failed} failed, in ${seconds.toFixed(0)} s`,
  );
  const row = (what: string, values: number[]) =>
    console.log(
      `${what}: ${values.length} looks, median ${median(values).toFixed(0)} ms, 95 % ${share(values, 0.95).toFixed(0)} ms`,
    );
  row('idle', idle);
  row('under load', loaded);
  console.log(`ratio of medians ${(median(loaded) / median(idle)).toFixed(2)}`);
}

void main();
