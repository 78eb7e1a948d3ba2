import { render, screen } from '@testing-library/react';
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
