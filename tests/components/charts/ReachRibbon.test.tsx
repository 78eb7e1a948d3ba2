import { fireEvent, render, screen } from '@testing-library/react';
import { ReachRibbon } from '@/components/charts/ReachRibbon';

const sections = [0, 500, 900, 1500].map((chainage, i) => ({ id: `XS-0${i + 1}`, chainage }));
const stations = [{ name: 'Sallow Mill', chainage: 900 }];

function show(at: number | null) {
  const onChange = jest.fn();
  render(
    <ReachRibbon
      sections={sections}
      stations={stations}
      at={at}
      onChange={onChange}
      unitSystem="metric"
      initialWidth={324}
    />,
  );
  return { onChange, slider: screen.getByRole('slider', { name: 'Place on the reach' }) };
}

test('tells the chosen place by name and chainage', () => {
  const { slider } = show(900);
  expect(slider.getAttribute('aria-valuetext')).toBe('Sallow Mill, 0.90 km');
  expect(slider.getAttribute('aria-valuenow')).toBe('900');
  expect(slider.getAttribute('aria-valuemin')).toBe('0');
  expect(slider.getAttribute('aria-valuemax')).toBe('1500');
});

test('keys move from section to section', () => {
  const { slider, onChange } = show(500);
  fireEvent.keyDown(slider, { key: 'ArrowRight' });
  fireEvent.keyDown(slider, { key: 'ArrowLeft' });
  fireEvent.keyDown(slider, { key: 'End' });
  expect(onChange.mock.calls).toEqual([[900], [0], [1500]]);
});

test('leaves keys alone that belong to the browser', () => {
  const { slider, onChange } = show(500);
  fireEvent.keyDown(slider, { key: 'ArrowRight', altKey: true });
  fireEvent.keyDown(slider, { key: 'Tab' });
  expect(onChange).not.toHaveBeenCalled();
});

test('a reach of nothing draws nothing', () => {
  render(<ReachRibbon sections={[]} at={null} onChange={jest.fn()} unitSystem="metric" />);
  expect(screen.queryByRole('slider')).toBeNull();
});
