import type { ReportFacts } from '../../../server/reports/types';

/** Facts of a checked and signed run; people and places are invented. */
export function sampleFacts(given: Partial<ReportFacts> = {}): ReportFacts {
  return {
    firmName: 'Tesk & Ambry Hydraulics',
    study: {
      title: 'Lower Veshall at Tornick',
      clientName: 'Tornick Town Council',
      place: 'Tornick, Veshall valley',
      verticalDatum: 'Tornick local datum 1998',
      purpose: 'Levels and times of the 1 in 100 year flood for the defences of the lower town.',
      unitSystem: 'metric',
    },
    survey: {
      revision: 2,
      fileName: 'veshall-2026.xlsx',
      fileHash: 'ab'.repeat(32),
      note: 'Sections 4 and 9 measured again.',
      sectionCount: 3,
      pointCount: 18,
      firstChainage: 0,
      lastChainage: 2500,
      sentBy: 'Ilse Quand',
      sentAt: '2026-09-02T08:15:00.000Z',
    },
    surveyed: [],
    run: {
      number: 3,
      scenarioName: '1 in 100 year',
      requestedBy: 'Oda Brennick',
      requestedAt: '2026-11-02T09:00:00.000Z',
      finishedAt: '2026-11-02T09:04:10.000Z',
      startsAt: '2026-11-14T00:00:00.000Z',
      caseHash: `sha256:${'c4'.repeat(32)}`,
      solverVersion: '1.0.0',
    },
    stations: [
      {
        id: 1,
        name: 'Mill bridge',
        chainage: 1000,
        levels: [{ kind: 'soffit', level: 52.4, note: '' }],
      },
      { id: 2, name: 'Ferrin quay', chainage: 1700 },
    ],
    confidence: [],
    review: {
      sentAt: '2026-11-03T10:00:00.000Z',
      method: 'Routed unsteady over the whole reach with the outlet well below the town.',
      assumptions: 'Bridges stand clear of the flood. The bed does not move.',
      limits: 'Not for the side valley of the Ebbick.',
      checklist: [
        {
          id: 'volumeBalance',
          title: 'Volume balance',
          outcome: 'good',
          finding: 'Error 0.00002 % of the volume that came in.',
          rule: 'Below 0.1 % good, above 1 % bad (common practice).',
          answer: null,
        },
        {
          id: 'calibration',
          title: 'Calibration',
          outcome: 'asked',
          finding: 'The machine cannot tell.',
          rule: 'Compare with observed levels before it is relied on (common practice).',
          answer: 'Two marks of the 2011 flood at the mill, within 0.15 m.',
        },
      ],
      points: [
        {
          id: 1,
          chainage: 1000,
          time: 5400,
          text: 'Why does the stage at the mill fall so slowly?',
          state: 'closed',
          raisedBy: { id: 9, name: 'Rurik Tesk' },
          raisedAt: '2026-11-04T09:30:00.000Z',
          entries: [
            {
              by: 'Oda Brennick',
              at: '2026-11-04T11:00:00.000Z',
              kind: 'answer',
              text: 'The meadow behind the mill drains through the narrow.',
            },
            { by: 'Rurik Tesk', at: '2026-11-05T08:00:00.000Z', kind: 'closed', text: '' },
          ],
        },
      ],
    },
    observed: null,
    signOff: {
      by: 'Rurik Tesk',
      qualification: 'Chartered Engineer',
      registrationNumber: 'TE-4471',
      statement: 'I have checked run 3 and did not run it myself.',
      at: '2026-11-05T08:30:00.000Z',
      verificationCode: '7K4QM2XW9TRB3HCD',
      supersedesRunNumber: 1,
    },
    withdrawal: null,
    verificationAddress: 'https://spate.example/verify',
    ...given,
  };
}
