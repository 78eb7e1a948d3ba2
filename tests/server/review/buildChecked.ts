import { signStatement } from '../../../shared/review/statement';
import type { Review } from '../../../shared/review/types';
import type { RunModel } from '../../../server/models/Run';
import type { UserModel } from '../../../server/models/User';
import { buildFirm } from '../../helpers/factories/buildFirm';
import { buildRoutedRun } from '../../helpers/factories/buildRoutedRun';
import { buildMember } from '../../helpers/factories/buildStudy';
import { buildUser, PASSWORD } from '../../helpers/factories/buildUser';
import type { TestServer } from '../../helpers/testServer';

export const WORDS = { method: 'Finite volumes.', assumptions: 'Fixed bed.', limits: 'No ice.' };

/** A firm with a modeller, two senior engineers and a client of the study, and the modeller's routed run. */
export async function buildChecked(server: TestServer) {
  const { services } = server;
  const firmId = (await buildFirm(services)).id;
  const modeller = await buildUser(services, ['modeller'], { firmId });
  const senior = await buildUser(services, ['seniorEngineer'], { firmId });
  const other = await buildUser(services, ['seniorEngineer'], { firmId });
  const client = await buildUser(services, ['client'], { firmId });
  const administrator = await buildUser(services, ['administrator'], { firmId });
  await senior.update({ qualification: 'Chartered Engineer', registrationNumber: 'R-1' });
  const made = await buildRoutedRun(services, modeller);
  await buildMember(services, made.study, client, 'client');
  return {
    ...made,
    firmId,
    people: { modeller, senior, other, client, administrator },
    asModeller: await server.signInAs(modeller),
    asSenior: await server.signInAs(senior),
    asClient: await server.signInAs(client),
  };
}
export type Checked = Awaited<ReturnType<typeof buildChecked>>;

export const statementOf = async (server: TestServer, run: RunModel): Promise<string> => {
  const { number, scenarioName, study } = await server.services.runs.find.again(run.id);
  return signStatement({ number, scenarioName, studyTitle: study!.title });
};

/** Sends the run, answers everything that is asked. */
export async function sendAnswered({ asModeller, run }: Checked): Promise<Review> {
  const sent = await asModeller.post(`/api/runs/${run.id}/review`).send(WORDS).expect(200);
  const answers = (sent.body as Review).checklist
    .filter(({ outcome }) => outcome === 'asked' || outcome === 'bad')
    .map(({ id }) => ({ id, answer: 'Looked at.' }));
  const put = asModeller.put(`/api/runs/${run.id}/review/answers`);
  return (await put.send({ answers }).expect(200)).body;
}

export async function sign(server: TestServer, checked: Checked, by?: UserModel): Promise<Review> {
  const api = by ? await server.signInAs(by) : checked.asSenior;
  const statement = await statementOf(server, checked.run);
  const post = api.post(`/api/runs/${checked.run.id}/review/sign`);
  return (await post.send({ statement, password: PASSWORD }).expect(200)).body;
}
