import {
  housePlaces,
  isAt,
  splitForPhone,
  studyPlaces,
  type Place,
} from '@/components/layout/places';
import { mayEnter } from '@/components/layout/studyDoors';
import type { Role } from '@/shared/accounts/roles';
import type { Me } from '@/shared/accounts/types';
import { STUDY_ACTIONS, type Study, type StudyAction } from '@/shared/studies/types';

const person = (...roles: Role[]): Me => ({
  id: 1,
  email: 'a@firm.example',
  name: 'A',
  roles,
  firm: { id: 1, name: 'Firm' },
  qualification: null,
  registrationNumber: null,
});
const study = (may: StudyAction[]): Study => ({
  id: 7,
  title: 'Lower Veshall at Tornick',
  clientName: '',
  place: '',
  verticalDatum: 'local',
  coordinateSystem: '',
  unitSystem: 'metric',
  purpose: '',
  createdAt: '2025-11-01T00:00:00Z',
  updatedAt: '2025-11-01T00:00:00Z',
  createdBy: 'Ines Corrow',
  may,
  counts: { surveyRevision: 3, surveysWaiting: 0, sections: 44, scenarios: 5, runs: 12 },
});
const labels = (places: Place[]) => places.map((place) => place.label);

test('an administrator alone has people, not studies', () => {
  expect(labels(housePlaces(person('administrator')))).toEqual(['People', 'Audit', 'Profile']);
  expect(labels(housePlaces(person('administrator', 'modeller')))).toEqual([
    'Studies',
    'Proof',
    'People',
    'Audit',
    'Profile',
  ]);
  expect(labels(housePlaces(person('client')))).toEqual(['Studies', 'Profile']);
});

test('a senior engineer sees how many runs wait for a check', () => {
  const [, queue] = housePlaces(person('seniorEngineer'), 3);
  expect(queue).toMatchObject({ label: 'To check', path: '/queue', aside: '3' });
  expect(housePlaces(person('seniorEngineer'), 0)[1].aside).toBeUndefined();
  expect(labels(housePlaces(person('modeller')))).not.toContain('To check');
});

test('a study shows the places that the person may enter, with what is in them', () => {
  const all = studyPlaces(study([...STUDY_ACTIONS]));
  expect(labels(all)).toEqual([
    'Study',
    'Survey',
    'Reach',
    'Stations',
    'Scenarios',
    'Runs',
    'Confidence',
    'Calibration',
  ]);
  expect(all.map((place) => place.aside)).toEqual([
    undefined,
    'rev 3',
    '44',
    undefined,
    '5',
    '12',
    undefined,
    undefined,
  ]);
  expect(labels(studyPlaces(study(['study.read', 'survey.send'])))).toEqual(['Study', 'Survey']);
  expect(labels(studyPlaces(study(['study.read'])))).toEqual(['Study']);
});

test('a phone shows at most five, and loses none', () => {
  const all = [...studyPlaces(study([...STUDY_ACTIONS])), ...housePlaces(person('modeller'))];
  const { shown, more } = splitForPhone(all);
  expect(labels(shown)).toEqual(['Survey', 'Reach', 'Scenarios', 'Runs']);
  expect(labels(more)).toEqual([
    'Study',
    'Stations',
    'Confidence',
    'Calibration',
    'Studies',
    'Proof',
    'Profile',
  ]);
  expect(splitForPhone(housePlaces(person('client'))).more).toEqual([]);
  const house = splitForPhone(housePlaces(person('administrator', 'seniorEngineer')));
  expect(labels(house.shown)).toEqual(['Studies', 'To check', 'Proof', 'People']);
  expect(labels(house.more)).toEqual(['Audit', 'Profile']);
});

test('one is at a place also on the screens under it', () => {
  const [overview, , , , , runs] = studyPlaces(study([...STUDY_ACTIONS]));
  expect(isAt(runs, '/studies/7/runs/12')).toBe(true);
  expect(isAt(overview, '/studies/7/runs/12')).toBe(false);
  expect(isAt(overview, '/studies/7')).toBe(true);
});

test('a screen opens only for those who may see what is on it', () => {
  const surveyor: StudyAction[] = ['study.read', 'survey.send'];
  expect(mayEnter(undefined, ['study.read'])).toBe(true);
  expect(mayEnter('survey', surveyor)).toBe(true);
  for (const segment of ['reach', 'stations', 'scenarios', 'runs']) {
    expect(mayEnter(segment, surveyor)).toBe(false);
    expect(mayEnter(segment, [...STUDY_ACTIONS])).toBe(true);
  }
  expect(mayEnter('survey', ['study.read'])).toBe(false);
});
