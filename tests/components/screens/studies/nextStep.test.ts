import { nextStep } from '@/components/screens/studies/nextStep';
import type { Study, StudyCounts } from '@/shared/studies/types';

const withCounts = (counts: StudyCounts): Study => ({
  id: 7,
  title: 'Lower Veshall at Tornick',
  clientName: '',
  place: '',
  verticalDatum: 'local',
  coordinateSystem: '',
  unitSystem: 'metric',
  purpose: '',
  createdAt: '',
  updatedAt: '',
  createdBy: '',
  may: [],
  counts,
});

test.each([
  [
    { surveyRevision: null, surveysWaiting: 0, sections: null, scenarios: 0, runs: 0 },
    'Hand in the survey',
    '/studies/7/survey',
  ],
  [
    { surveyRevision: 1, surveysWaiting: 0, sections: 44, scenarios: 0, runs: 0 },
    'Set up a scenario',
    '/studies/7/scenarios',
  ],
  [
    { surveyRevision: 1, surveysWaiting: 0, sections: 44, scenarios: 2, runs: 0 },
    'Route a flood',
    '/studies/7/scenarios',
  ],
  [
    { surveyRevision: 1, surveysWaiting: 0, sections: 44, scenarios: 2, runs: 3 },
    'See the runs',
    '/studies/7/runs',
  ],
])('%j: %s', (counts, label, href) => {
  expect(nextStep(withCounts(counts))).toEqual({ label, href });
});
