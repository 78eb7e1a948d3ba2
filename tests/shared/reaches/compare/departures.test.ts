import { departureWords } from '@/shared/reaches/compare/departures';
import { shiftDatum } from '@/shared/reaches/edit/shiftDatum';
import { plainSections } from '../../../helpers/plainSections';

const surveyed = plainSections();

test('ground that was routed as it was surveyed, whatever banks and roughness', () => {
  const routed = surveyed.map((section) => ({ ...section, banks: null, roughness: [] }));
  expect(departureWords(surveyed, routed)).toBe('as surveyed');
});

test('what was changed is counted', () => {
  const [one, two, three] = surveyed;
  const routed = [
    shiftDatum(one, 0.2),
    { ...two, chainage: 510 },
    three,
    { ...three, id: 'XS-03/1', chainage: 1250 },
  ];
  expect(departureWords(surveyed, routed)).toBe(
    'working geometry; sections: 1 added, 1 taken out, 1 with other points, 1 at another chainage',
  );
});
