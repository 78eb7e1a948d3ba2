import {
  createPlaceAndTime,
  placeAndTimeOf,
  readPlaceAndTime,
  writePlaceAndTime,
} from '@/components/charts/placeAndTime';

test('what is written into the address is read back from it', () => {
  expect(readPlaceAndTime(writePlaceAndTime({ at: 10_600, t: 81_000 }))).toEqual({
    at: 10_600,
    t: 81_000,
  });
  expect(writePlaceAndTime({ at: 1234.5678, t: 0 })).toEqual({ at: '1234.57', t: '0' });
  expect(writePlaceAndTime({ at: null, t: null })).toEqual({});
});

test.each([undefined, '', ' ', 'bridge', 'NaN', '1e999', ['1', '2']])(
  'an address that says %p says nothing',
  (at) => expect(readPlaceAndTime({ at })).toEqual({}),
);

test('listeners hear of changes, and of changes only', () => {
  const store = createPlaceAndTime();
  const heard = jest.fn();
  const stop = store.subscribe(heard);
  store.setAt(500);
  store.setAt(500);
  store.setT(60);
  expect(heard).toHaveBeenCalledTimes(2);
  stop();
  store.setT(61);
  expect(heard).toHaveBeenCalledTimes(2);
  expect(store.get()).toEqual({ at: 500, t: 61 });
});

test('while the flood plays, what React draws follows a few times a second and catches up when it stands', () => {
  const store = createPlaceAndTime();
  const [each, shown] = [jest.fn(), jest.fn()];
  store.subscribe(each);
  store.subscribeShown(shown);
  for (let frame = 0; frame < 60; frame++) store.playT(frame, frame * (1000 / 60));
  expect(each).toHaveBeenCalledTimes(60);
  expect(shown.mock.calls.length).toBeGreaterThanOrEqual(3);
  expect(shown.mock.calls.length).toBeLessThanOrEqual(5);
  expect(store.get().t).toBe(59);
  expect(store.shown().t).toBeLessThan(59);
  store.settle();
  expect(store.shown()).toEqual(store.get());
  store.setT(10);
  expect(store.shown().t).toBe(10);
});

test('the screens of a study stand at one place, those of another at their own', () => {
  placeAndTimeOf('1').setAt(900);
  expect(placeAndTimeOf('1').get().at).toBe(900);
  expect(placeAndTimeOf('2').get().at).toBeNull();
});
