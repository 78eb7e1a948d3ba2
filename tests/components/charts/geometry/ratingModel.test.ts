import { ratingModel } from '@/components/charts/geometry/ratingModel';

const series = {
  times: [0, 1, 2, 3, 4],
  stage: [10, 11, 12, 11, 10],
  flow: [50, 120, 150, 90, 50],
};

test('the loop parts at its highest stage, and its heads follow time', () => {
  const model = ratingModel({ width: 400, height: 240 }, series, 'metric');
  const ends = (path: string) =>
    path
      .slice(1)
      .split('L')
      .map((point) => point.split(',').map(Number));
  const [rising, falling] = [ends(model.rising), ends(model.falling)];
  expect(rising).toHaveLength(3);
  expect(falling).toHaveLength(3);
  expect(rising[2]).toEqual(falling[0]);
  expect(rising[0]).toEqual(falling[2]);
  // At one stage the rising limb carries more: further right.
  expect(rising[1][0]).toBeGreaterThan(falling[1][0]);
  expect(model.arrows.length).toBeGreaterThan(1);
  expect(Math.cos((model.arrows[0].turn * Math.PI) / 180)).toBeGreaterThan(0);
});

test('in US customary units the axes are in feet', () => {
  const model = ratingModel({ width: 400, height: 240 }, series, 'usCustomary');
  expect(model.frame.y.domain()[0]).toBeGreaterThan(30);
  expect(model.frame.x.domain()[1]).toBeGreaterThan(5000);
});
