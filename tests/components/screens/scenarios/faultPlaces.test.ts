import { anchorOf, messageAt, partOf, placeOf } from '@/components/screens/scenarios/faultPlaces';

describe('where a fault of a scenario is shown', () => {
  it.each([
    ['upstream.peakFlow', 'upstream.peakFlow', 'upstream', 'scenario-upstream-peakFlow'],
    ['upstream.times[3]', 'upstream.values', 'upstream', 'scenario-upstream-values'],
    ['upstream.flows', 'upstream.values', 'upstream', 'scenario-upstream-values'],
    ['laterals[1].flows[2]', 'laterals[1].values', 'laterals', 'scenario-laterals-1-values'],
    ['laterals[1].from', 'laterals[1].from', 'laterals', 'scenario-laterals-1-from'],
    ['initial.stageAbove', 'initial.stageAbove', 'initial', 'scenario-initial-stageAbove'],
    [
      'structures[0].offsets[1]',
      'structures[0].values',
      'structures',
      'scenario-structures-0-values',
    ],
    [
      'structures[2].dam.height',
      'structures[2].dam.height',
      'structures',
      'scenario-structures-2-dam-height',
    ],
    [
      'upstream.storage.volumes[4]',
      'upstream.storage.values',
      'upstream',
      'scenario-upstream-storage-values',
    ],
    ['name', 'name', 'details', 'scenario-name'],
  ])('%s', (path, place, part, anchor) => {
    expect(placeOf(path)).toBe(place);
    expect(partOf(path)).toBe(part);
    expect(anchorOf(path)).toBe(anchor);
  });

  it('says the first fault of a place, its row, and how many more there are', () => {
    const faults = [
      { path: 'upstream.times[3]', message: 'Time goes back.' },
      { path: 'upstream.flows[7]', message: 'Flow is negative.' },
      { path: 'numerics.cellSize', message: 'Give a cell size.' },
    ];
    expect(messageAt(faults, 'upstream.values')).toBe('Row 4: Time goes back. (and 1 more)');
    expect(messageAt(faults, 'numerics.cellSize')).toBe('Give a cell size.');
    expect(messageAt(faults, 'name')).toBeUndefined();
  });
});
