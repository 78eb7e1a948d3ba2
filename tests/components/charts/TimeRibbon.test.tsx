import { fireEvent, render, screen } from '@testing-library/react';
import { TimeProgress, TimeRibbon } from '@/components/charts/TimeRibbon';

/** A time that stands, or is moved by the test. */
function liveAt(t: number) {
  const listeners = new Set<() => void>();
  return {
    time: () => t,
    subscribe: (listener: () => void) => {
      listeners.add(listener);
      return () => void listeners.delete(listener);
    },
    moveTo: (next: number) => {
      t = next;
      listeners.forEach((listener) => listener());
    },
  };
}

const inflow = { times: [0, 36_000, 172_800], flows: [50, 490, 60] };

test('the flood is a slider in time, told in hours and by the clock', () => {
  const onChange = jest.fn();
  render(
    <TimeRibbon
      inflow={inflow}
      end={172_800}
      live={liveAt(81_000)}
      t={81_000}
      step={300}
      startsAt="2024-11-14T06:00:00Z"
      onChange={onChange}
      initialWidth={366}
    />,
  );
  const slider = screen.getByRole('slider', { name: 'Time' });
  expect(slider.getAttribute('aria-valuetext')).toBe('22 h 30, 15 Nov, 04:30');
  fireEvent.keyDown(slider, { key: 'ArrowRight' });
  fireEvent.keyDown(slider, { key: 'PageUp' });
  fireEvent.keyDown(slider, { key: 'Home' });
  // A page is a tenth of the run: 58 of 577 output times.
  expect(onChange.mock.calls).toEqual([[81_300], [81_000 + 58 * 300], [0]]);
});

test('while it computes it is a progress bar', () => {
  render(
    <TimeProgress
      inflow={inflow}
      end={172_800}
      reached={60_000}
      progress={0.347}
      valueText="34 %, about 20 s left"
      initialWidth={366}
    />,
  );
  const bar = screen.getByRole('progressbar', { name: 'Progress of the run' });
  expect(bar.getAttribute('aria-valuenow')).toBe('35');
  expect(bar.getAttribute('aria-valuetext')).toBe('34 %, about 20 s left');
});

test('a run without an inflow still has its time to move along', () => {
  render(
    <TimeRibbon
      inflow={{ times: [], flows: [] }}
      end={600}
      live={liveAt(60)}
      t={60}
      step={60}
      startsAt={null}
      onChange={jest.fn()}
      initialWidth={366}
    />,
  );
  expect(screen.getByRole('slider').getAttribute('aria-valuetext')).toBe('1 min 00');
});

test('while the flood plays its hand moves without being drawn anew', () => {
  const live = liveAt(0);
  const { container } = render(
    <TimeRibbon
      inflow={inflow}
      end={172_800}
      live={live}
      t={0}
      step={300}
      startsAt={null}
      onChange={jest.fn()}
      initialWidth={366}
    />,
  );
  const passed = () => Number(container.querySelector('clipPath rect')!.getAttribute('width'));
  const knob = () => Number(container.querySelector('circle')!.getAttribute('cy'));
  const [before, low] = [passed(), knob()];
  live.moveTo(36_000);
  // 8 px are left free at both ends of 366 px.
  expect(passed() - before).toBeCloseTo((350 * 36_000) / 172_800, 0);
  // The peak of the inflow stands highest, at the top of the plot.
  expect(knob()).toBeLessThan(low);
  expect(knob()).toBe(10);
});
