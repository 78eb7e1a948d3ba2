import { fireEvent, render, screen } from '@testing-library/react';
import { CrossSection } from '@/components/charts/CrossSection';
import { Hydrograph } from '@/components/charts/Hydrograph';
import { LongSection } from '@/components/charts/LongSection';

const times = [0, 3600, 7200, 10_800, 14_400];
const stage = { times, values: [39, 41, 44.66, 42, 40] };

test('a hydrograph names its peak and reads out the cursor', () => {
  const { container } = render(
    <Hydrograph
      label="Stage at Tornick bridge"
      quantity="elevation"
      series={stage}
      t={9000}
      unitSystem="metric"
      initialWidth={352}
    />,
  );
  expect(
    screen.getByRole('img', {
      name: 'Stage at Tornick bridge; highest 44.66 m at 2 h 00; 43.33 m at 2 h 30',
    }),
  ).toBeTruthy();
  expect(container.textContent).toContain('44.66 m at 2 h 00');
  expect(container.textContent).toContain('43.33 m');
});

test('the peak that is given counts, not the highest of the output times', () => {
  const { container } = render(
    <Hydrograph
      label="Stage"
      quantity="elevation"
      series={stage}
      peak={{ value: 44.71, time: 7500 }}
      t={null}
      unitSystem="metric"
      initialWidth={352}
    />,
  );
  expect(container.textContent).toContain('44.71 m at 2 h 05');
});

test('no values are said to be none', () => {
  render(
    <Hydrograph
      label="Flow"
      quantity="flow"
      series={{ times: [], values: [] }}
      t={null}
      unitSystem="metric"
      initialWidth={352}
    />,
  );
  expect(screen.getByRole('img', { name: 'Flow: no values' })).toBeTruthy();
});

test('a long section reads out water and peak at the chosen place, the exact ones where known', () => {
  const profile = { chainages: [0, 1000], bed: [10, 8], peakStage: [14, 12] };
  const common = {
    profile,
    stage: [12, 10],
    sections: [
      { id: 'A', chainage: 0 },
      { id: 'B', chainage: 1000 },
    ],
    at: 500,
    unitSystem: 'metric',
    initialWidth: 720,
  } as const;
  const { rerender } = render(<LongSection {...common} />);
  expect(
    screen.getByRole('img', { name: 'Long section. At 0.50 km: 11.00 m, peak 13.00 m' }),
  ).toBeTruthy();
  rerender(<LongSection {...common} reading={{ stage: 11.02, peakStage: 13.04 }} />);
  expect(screen.getByRole('img', { name: /11\.02 m, peak 13\.04 m/ })).toBeTruthy();
});

test('a cross-section tells its water, in the units of the study', () => {
  const section = {
    points: [
      [0, 10],
      [10, 0],
      [20, 10],
    ] as [number, number][],
    banks: [2, 18] as [number, number],
    roughness: [[0, 0.04]] as [number, number][],
  };
  const { rerender, container } = render(
    <CrossSection
      label="Section XS-15"
      section={section}
      stage={4}
      unitSystem="metric"
      initialWidth={352}
    />,
  );
  expect(screen.getByRole('img').getAttribute('aria-label')).toBe(
    'Section XS-15, looking downstream; lowest ground 0.00 m; water at 4.00 m; banks at 2.0 and 18.0 m',
  );
  expect(container.textContent).toContain('n 0.040');
  rerender(
    <CrossSection
      label="Section XS-15"
      section={section}
      stage={-1}
      unitSystem="usCustomary"
      initialWidth={352}
    />,
  );
  const label = screen.getByRole('img').getAttribute('aria-label');
  expect(label).toContain('dry at this time');
  // 2 m are 6.6 ft, 18 m are 59.1 ft.
  expect(label).toContain('banks at 6.6 and 59.1 ft');
});

const RAISED = [
  { id: 41, number: 1, isClosed: true, words: 'Point 1, closed', chainage: 500, time: 3600 },
  { id: 52, number: 2, isClosed: false, words: 'Point 2, open', chainage: 500, time: 7200 },
];

test.each(['on the long section', 'on a hydrograph'])(
  'points that were raised %s are numbered, and each leads to itself',
  (where) => {
    const onPoint = jest.fn();
    const common = { points: RAISED, onPoint, unitSystem: 'metric', initialWidth: 352 } as const;
    const { container } = render(
      where === 'on the long section' ? (
        <LongSection
          {...common}
          profile={{ chainages: [0, 1000], bed: [40, 39], peakStage: [44, 43] }}
          sections={[]}
          at={null}
        />
      ) : (
        <Hydrograph {...common} label="Stage" quantity="elevation" series={stage} t={null} />
      ),
    );
    fireEvent.click(screen.getByRole('button', { name: 'Point 2, open' }));
    expect(onPoint.mock.calls).toEqual([[52]]);
    // A screen reader sees nothing within an image.
    expect(container.querySelector('[role="img"] [role="button"]')).toBeNull();
    const boxes = [...container.querySelectorAll('rect')].map((box) => box.getAttribute('fill'));
    expect(new Set(boxes).size).toBe(2);
    expect(container.textContent).toContain('12');
  },
);

test('a level that a flood was seen at fits into the long section, however high', () => {
  const { container } = render(
    <LongSection
      profile={{ chainages: [0, 1000], bed: [40, 39], peakStage: [44, 43] }}
      observed={[
        { chainage: 400, level: 61, tolerance: 0.5 },
        { chainage: 5000, level: 41, tolerance: 0.5 },
      ]}
      sections={[]}
      at={null}
      unitSystem="metric"
      initialWidth={352}
    />,
  );
  expect(screen.getByRole('img', { name: /Observed levels: 2/ })).toBeTruthy();
  const crosses = [...container.querySelectorAll('path')].filter((path) =>
    path.getAttribute('d')!.includes('l8 8M'),
  );
  expect(crosses).toHaveLength(1);
  const y = Number(/^M[\d.]+ ([\d.]+)/.exec(crosses[0].getAttribute('d')!)![1]);
  expect(y).toBeGreaterThan(20);
});
