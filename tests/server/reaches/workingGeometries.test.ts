import type { ReachModel } from '../../../server/models/Reach';
import type { StudyModel } from '../../../server/models/Study';
import type { UserModel } from '../../../server/models/User';
import { changeBetween } from '../../../shared/reaches/edit/geometryChange';
import { movePoint } from '../../../shared/reaches/edit/movePoint';
import type { PlanFeature } from '../../../shared/reaches/plan/geoJson';
import type { Section } from '../../../shared/surveys/types';
import { packJson } from '../../../server/database/packedJson';
import { buildReach } from '../../helpers/factories/buildReach';
import { buildRoutedRun } from '../../helpers/factories/buildRoutedRun';
import { buildScenario } from '../../helpers/factories/buildScenario';
import { buildMember, buildStudy } from '../../helpers/factories/buildStudy';
import { buildUser } from '../../helpers/factories/buildUser';
import { plainSections } from '../../helpers/plainSections';
import { sampleCase } from '../results/sampleRun';
import { startTestServer, type TestServer } from '../../helpers/testServer';

let server: TestServer;
let modeller: UserModel;
let study: StudyModel;
let surveyed: ReachModel;
beforeAll(async () => {
  server = await startTestServer();
  modeller = await buildUser(server.services, ['modeller']);
}, 60_000);
beforeEach(async () => {
  study = await buildStudy(server.services, modeller);
  surveyed = await buildReach(server.services, study);
});
afterAll(() => server.stop());

const api = () => server.signInAs(modeller);
const copy = async (name = 'Dredged', status = 201) =>
  (
    await (
      await api()
    )
      .post(`/api/studies/${study.id}/reaches`)
      .send({ name, copyOf: surveyed.id })
      .expect(status)
  ).body;
const save = async (id: number, version: number, after: Section[], status = 200) =>
  (
    await (
      await api()
    )
      .put(`/api/reaches/${id}/geometry`)
      .send({ version, ...changeBetween(plainSections(), after), steps: ['Bed dug out'] })
      .expect(status)
  ).body;

/** XS-02 dug half a metre deeper, XS-03 gone, one more at 1,250 m. */
function dredged(): Section[] {
  const [one, two, , four] = plainSections();
  return [
    one,
    movePoint(movePoint(two, 3, [26, 9]), 4, [32, 9]),
    { ...four, id: 'Ford', chainage: 1250, storage: [{ from: 0, to: 10, flowsAbove: 14 }] },
    { ...four, embankments: { left: { offset: 20, crest: 12.5 } } },
  ];
}

test('a working geometry is a named copy; the reach of the survey and the survey itself stay', async () => {
  const made = await copy();
  expect(made).toMatchObject({ name: 'Dredged', copiedFrom: surveyed.id, version: 1, revision: 1 });
  const changed = await save(made.id, 1, dredged());
  expect(changed.version).toBe(2);
  expect(changed.sectionCount).toBe(4);
  expect(changed.sections.map(({ id }: Section) => id)).toEqual([
    'XS-01',
    'XS-02',
    'Ford',
    'XS-04',
  ]);
  expect(changed.sections[1]).toMatchObject({ thalweg: 9 });
  expect(changed.sections[2].storage).toEqual([{ from: 0, to: 10, flowsAbove: 14 }]);
  expect(changed.sections[3].embankments).toEqual({ left: { offset: 20, crest: 12.5 } });

  const { body: base } = await (await api()).get(`/api/reaches/${surveyed.id}`);
  expect(base).toMatchObject({ version: 1, copiedFrom: null });
  expect(base.sections[1].points).toEqual(plainSections()[1].points);
  const { body: survey } = await (await api()).get(`/api/surveys/${surveyed.surveyRevisionId}`);
  expect(survey.sections).toEqual(plainSections());
});

test('its history says who did what when, in the words of the change and step by step', async () => {
  const { id } = await copy();
  await save(id, 1, dredged());
  await (
    await api()
  )
    .patch(`/api/reaches/${id}/sections`)
    .send({ version: 2, sectionIds: ['XS-01'], banks: null })
    .expect(200);
  const { body } = await (await api()).get(`/api/reaches/${id}/changes`).expect(200);
  expect(
    body.map(({ version, words }: { version: number; words: string }) => [version, words]),
  ).toEqual([
    [3, 'XS-01: bank marks'],
    [2, 'Ford: added; XS-03: removed; XS-02: points; XS-04: embankments'],
    [1, 'Copied from Revision 1, version 1'],
  ]);
  expect(body[1]).toMatchObject({ steps: ['Bed dug out'], changedBy: modeller.name });
  expect(Date.parse(body[1].changedAt)).toBeGreaterThan(0);
});

test('what was made on an older version is a conflict and changes nothing', async () => {
  const { id } = await copy();
  await save(id, 1, dredged());
  const { error } = await save(id, 1, plainSections().slice(0, 2), 409);
  expect(error).toMatchObject({ code: 'conflict', details: { version: 2 } });
  expect((await (await api()).get(`/api/reaches/${id}`)).body.sectionCount).toBe(4);
});

test('sections of the reach of a survey are not changed: it says to make a working geometry', async () => {
  const { error } = await save(surveyed.id, 1, dredged(), 409);
  expect(error.message).toContain('make a working geometry');
  await (await api()).patch(`/api/reaches/${surveyed.id}`).send({ name: 'Mine' }).expect(409);
  await (await api()).delete(`/api/reaches/${surveyed.id}`).expect(409);
});

test('faults come back at their section and place, and nothing is stored', async () => {
  const { id } = await copy();
  const [one, two, ...rest] = plainSections();
  const broken = [
    { ...one, banks: [38, 20] as [number, number] },
    { ...two, points: two.points.map(([y, z], i): [number, number] => [i === 3 ? 15 : y, z]) },
    ...rest,
  ];
  const { error } = await save(id, 1, broken, 422);
  expect(error.faults.map(({ path }: { path: string }) => path)).toEqual([
    'sections[XS-01].banks[1]',
    'sections[XS-02].points[3][0]',
  ]);
  const one_ = await save(id, 1, [one], 422);
  expect(one_.error.faults[0].message).toContain('two sections');
  const sent = {
    version: 1,
    sections: [{ id: 'A', chainage: 0, points: [[0, 'x']], roughness: [] }],
  };
  const shape = await (await api()).put(`/api/reaches/${id}/geometry`).send(sent).expect(422);
  expect(shape.body.error.faults[0].path).toBe('sections[0].points');
  expect((await (await api()).get(`/api/reaches/${id}`)).body.version).toBe(1);
});

test('names are unique in the study, and may be changed', async () => {
  const { id } = await copy();
  const { error } = await copy('Dredged', 422);
  expect(error.faults[0].path).toBe('name');
  const { body } = await (
    await api()
  )
    .patch(`/api/reaches/${id}`)
    .send({ name: 'Deeper' })
    .expect(200);
  expect(body).toMatchObject({ name: 'Deeper', version: 1 });
  const elsewhere = await buildReach(server.services, await buildStudy(server.services, modeller));
  await (
    await api()
  )
    .post(`/api/studies/${study.id}/reaches`)
    .send({ name: 'Foreign', copyOf: elsewhere.id })
    .expect(422);
});

test('a scenario stands on it and is told anew; only then it cannot be removed', async () => {
  const made = await copy();
  const scenario = await buildScenario(
    server.services,
    await server.services.models.Reach.scope('withSections').findByPk(made.id, {
      rejectOnEmpty: true,
    }),
  );
  expect(scenario.faultCount).toBe(0);
  await save(
    made.id,
    1,
    plainSections().map((section) => ({ ...section, roughness: [] })),
  );
  expect((await scenario.reload()).faultCount).toBe(1);
  await (await api()).delete(`/api/reaches/${made.id}`).expect(409);
  await scenario.destroy();
  await (await api()).delete(`/api/reaches/${made.id}`).expect(204);
  await (await api()).get(`/api/reaches/${made.id}`).expect(404);
});

test('who may not see the reach can do none of it', async () => {
  const { id } = await copy();
  const surveyor = await buildUser(server.services, ['surveyor'], { firmId: modeller.firmId });
  await buildMember(server.services, study, surveyor, 'surveyor');
  for (const person of [surveyor, await buildUser(server.services, ['modeller'])]) {
    const theirs = await server.signInAs(person);
    const change = { version: 1, sections: [], removed: ['XS-02'], steps: [] };
    await theirs
      .post(`/api/studies/${study.id}/reaches`)
      .send({ name: 'Theirs', copyOf: surveyed.id })
      .expect(404);
    await theirs.put(`/api/reaches/${id}/geometry`).send(change).expect(404);
    await theirs.patch(`/api/reaches/${id}`).send({ name: 'Theirs' }).expect(404);
    await theirs.delete(`/api/reaches/${id}`).expect(404);
    await theirs.get(`/api/reaches/${id}/changes`).expect(404);
    await theirs.get(`/api/reaches/${id}/plan.geojson`).expect(404);
  }
});

test('the plan is given once the study names its coordinate system', async () => {
  const placed = plainSections().map((section) => ({
    ...section,
    coordinates: section.points.map(([y]): [number, number] => [5000 + y, 7000 + section.chainage]),
  }));
  const reach = await buildReach(server.services, study, placed);
  const ask = async () => (await api()).get(`/api/reaches/${reach.id}/plan.geojson`);
  const refused = await ask();
  expect(refused.status).toBe(422);
  expect(refused.body.error.faults[0].path).toBe('coordinateSystem');
  await study.update({ coordinateSystem: 'Local grid' });
  const given = await ask();
  expect(given.status).toBe(200);
  expect(given.headers['content-type']).toContain('application/geo+json');
  const plan = JSON.parse(given.text ?? given.body.toString('utf8'));
  expect(plan).toMatchObject({ type: 'FeatureCollection', coordinateSystem: 'Local grid' });
  expect(plan.features).toHaveLength(5);
  const bare = await (await api()).get(`/api/reaches/${surveyed.id}/plan.geojson`).expect(422);
  expect(bare.body.error.faults[0].path).toBe('sections');
});

test('the plan of a run joins the edges of its highest water, on the sections as they were routed', async () => {
  const { run, study: routed, reach } = await buildRoutedRun(server.services, modeller);
  await routed.update({ coordinateSystem: 'Local grid' });
  const placed = sampleCase().sections.map((section) => ({
    ...section,
    // Changed since: the run keeps the points it was routed on.
    points: section.points.map(([y, z]): [number, number] => [y, z + 3]),
    coordinates: section.points.map(([y]): [number, number] => [y, section.chainage]),
  }));
  await reach.update({ sections: await packJson(placed) });
  const given = await (await api()).get(`/api/runs/${run.id}/plan.geojson`).expect(200);
  const plan = JSON.parse(given.text ?? given.body.toString('utf8'));
  const kinds = plan.features.map((feature: PlanFeature) => feature.properties.kind);
  expect(kinds.filter((kind: string) => kind === 'peakExtent')).toHaveLength(2);
  expect(plan.notes.join(' ')).toMatch(/drawn by straight lines, not computed/);
  const { body: summary } = await (await api()).get(`/api/runs/${run.id}/summary`);
  const extent = plan.features.find((f: PlanFeature) => f.properties.kind === 'peakExtent');
  const stage = summary.sections[0].peakStage;
  expect(extent.properties.fromPeakStage).toBe(stage);
  // The left bank falls 4 m over 2 m from 10 m on: the edge by hand, on the ground that was routed.
  const edge = 10 + (54 - stage) / 2;
  expect(stage).toBeLessThan(54);
  expect(extent.geometry.coordinates[0][0][0]).toBeCloseTo(edge, 9);
  const stranger = await server.signInAs(await buildUser(server.services, ['modeller']));
  await stranger.get(`/api/runs/${run.id}/plan.geojson`).expect(404);
});
