import { setTimeout as wait } from 'node:timers/promises';
import { signStatement } from '../shared/review/statement';
import type { Review } from '../shared/review/types';
import type { Services } from '../server/composition';
import type { RunModel } from '../server/models/Run';
import type { UserModel } from '../server/models/User';
import { DEMO_ACCOUNTS, DEMO_PASSWORD } from './accounts';
import { ANSWERS, NOTE, OPEN_POINT, SETTLED_POINT } from './checkWords';
import { DESIGN_FLOOD, LARGER_FLOOD } from './scenarios';

const LOOK_MILLISECONDS = 1000;

/**
 * Checks the demo runs once they are routed: the design flood is sent, questioned, signed and issued, the larger flood
 * stays in check with an open point. Goes through the real services; what was begun is completed at the next start, and
 * what people have signed, returned or withdrawn stays so.
 */
export async function seedChecks(services: Services): Promise<void> {
  let stopped = false;
  services.onClose(() => void (stopped = true));
  const [modeller, senior] = await Promise.all(
    ['Ines Corrow', 'Rurik Tesk'].map((name) => person(services, name)),
  );
  if (!modeller || !senior) return;
  const people = { modeller, senior };
  const flood = await routed(services, modeller, DESIGN_FLOOD, () => stopped);
  if (flood) await checkAndIssue(services, people, flood);
  const larger = await routed(services, modeller, LARGER_FLOOD, () => stopped);
  if (larger) await leaveOpen(services, people, larger);
}

interface People {
  modeller: UserModel;
  senior: UserModel;
}

/** One of the demo people; null where they are gone. */
export const person = ({ models }: Services, name: string): Promise<UserModel | null> =>
  models.User.findOne({
    where: { email: DEMO_ACCOUNTS.find((account) => account.name === name)!.email, active: true },
  });

/** The modeller's first run of a scenario, once it is routed; null where it comes to another end, or the server stops. */
export async function routed(
  { models, runs }: Services,
  { id: requestedBy }: UserModel,
  scenarioName: string,
  stopped: () => boolean,
): Promise<RunModel | null> {
  for (;;) {
    if (stopped()) return null;
    const run = await models.Run.findOne({ where: { requestedBy, scenarioName }, order: ['id'] });
    if (run?.state === 'routed') return runs.find.again(run.id);
    if (run?.state !== 'queued' && run?.state !== 'running') return null;
    await wait(LOOK_MILLISECONDS);
  }
}

async function checkAndIssue(services: Services, people: People, run: RunModel): Promise<void> {
  const { modeller, senior } = people;
  const { reviews, runs } = services;
  let review = await send(services, people, run);
  if (review.state === 'inCheck') {
    if (review.points.length === 0) await reviews.points.raise(run, senior, SETTLED_POINT);
    for (const { id, state } of (await read(services, senior, run)).points) {
      const { record } = (await reviews.loadPoint(id, senior))!;
      const { answer: text, closing } = SETTLED_POINT;
      if (state === 'open') await reviews.points.write(record, modeller, 'answer', { text });
      if (state !== 'closed')
        await reviews.points.write(record, senior, 'closed', { text: closing });
    }
    const { number, scenarioName, study } = run;
    const statement = signStatement({ number, scenarioName, studyTitle: study!.title });
    await reviews.sign(run, senior, { statement, password: DEMO_PASSWORD });
    review = await read(services, senior, run);
  }
  if (review.state !== 'signed') return;
  const stationIds = (await runs.results.stations(run.studyId)).map(({ id }) => id);
  const message = 'Levels and times for the design flood, as agreed in November.';
  await reviews.issue(run, senior, { stationIds, message });
}

async function leaveOpen(services: Services, people: People, run: RunModel): Promise<void> {
  const review = await send(services, people, run);
  if (review.state === 'inCheck' && review.points.length === 0)
    await services.reviews.points.raise(run, people.senior, OPEN_POINT);
}

/** Sent and answered, where nobody has done it. */
async function send(services: Services, people: People, run: RunModel): Promise<Review> {
  const { modeller, senior } = people;
  const { reviews } = services;
  const before = await read(services, modeller, run);
  if (before.state === null) await reviews.send(run, modeller, { ...NOTE, sentTo: senior.id });
  const review = await read(services, modeller, run);
  if (review.state !== 'inCheck') return review;
  const answers = review.checklist
    .filter(({ answer, outcome }) => !answer && outcome !== 'good')
    .map(({ id }) => ({ id, answer: ANSWERS[id] ?? ANSWERS.other }));
  if (answers.length > 0) await reviews.answer(run, modeller, { answers });
  return read(services, modeller, run);
}

const read = async ({ reviews, runs }: Services, actor: UserModel, run: RunModel) =>
  reviews.read(await runs.find.again(run.id), actor);
