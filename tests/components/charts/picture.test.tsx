import { fireEvent, render, screen, waitFor } from '@testing-library/react';
import { Hydrograph } from '@/components/charts/Hydrograph';
import { PictureProvider } from '@/components/charts/picture/pictureContext';
import { pictureName, pictureTitle } from '@/components/charts/picture/pictureName';
import { pictureSource } from '@/components/charts/picture/pictureSource';
import { pictureSvg } from '@/components/charts/picture/pictureSvg';
import { COLOURS } from '@/components/theme/tokens';
import { saveBlob } from '@/components/queries/saveBlob';

jest.mock('@/components/queries/saveBlob', () => ({ saveBlob: jest.fn() }));

const SOURCE = pictureSource({
  studyTitle: 'Lower Veshall',
  number: 3,
  scenarioName: 'Design flood',
  review: null,
});
const drawn = () => (
  <Hydrograph
    label="Stage at Tornick bridge"
    quantity="elevation"
    series={{ times: [0, 3600, 7200], values: [39, 44.66, 42] }}
    levels={[{ name: 'Bridge soffit', level: 45 }]}
    t={null}
    unitSystem="metric"
    initialWidth={352}
  />
);
const parse = (svg: string) => new DOMParser().parseFromString(svg, 'image/svg+xml');

test('a picture holds its title and unit, the drawing, and in its foot where it comes from', () => {
  const { container } = render(drawn());
  const { svg, width, height } = pictureSvg(container.querySelector('svg')!, {
    title: 'Stage at Tornick bridge',
    unit: 'm',
    label: 'Stage at Tornick bridge; highest 44.66 m',
    source: SOURCE,
  });
  const picture = parse(svg);
  expect(picture.querySelector('parsererror')).toBeNull();
  const texts = [...picture.querySelectorAll('text')].map((node) => node.textContent);
  expect(texts).toEqual(
    expect.arrayContaining([
      'Stage at Tornick bridge, m',
      'Lower Veshall',
      'Run 3, Design flood. Preliminary, not signed.',
      'Bridge soffit',
    ]),
  );
  expect(picture.querySelector('path')!.getAttribute('d')).toMatch(/^M/);
  expect(picture.querySelector('desc')!.textContent).toContain('44.66 m');
  expect(svg).toContain('Source Sans 3');
  expect(width).toBeGreaterThan(352);
  expect(height).toBeGreaterThan(180);
});

test('what was drawn in the dark is told in light colours', () => {
  const { container } = render(
    <svg width={100} height={50}>
      <path d="M0 0L1 1" stroke={COLOURS.dark.water} />
    </svg>,
  );
  const parts = { title: 'Flow', label: 'Flow', source: SOURCE };
  const { svg } = pictureSvg(container.querySelector('svg')!, parts);
  expect(svg).toContain(COLOURS.light.water);
  expect(svg).not.toContain(COLOURS.dark.water);
});

test('the button saves a file that says what it is; without a source there is none', async () => {
  const { rerender } = render(drawn());
  expect(screen.queryByRole('button')).toBeNull();
  rerender(<PictureProvider value={SOURCE}>{drawn()}</PictureProvider>);
  fireEvent.click(screen.getByRole('button', { name: 'Picture of Stage at Tornick bridge' }));
  fireEvent.click(screen.getByRole('button', { name: 'SVG of Stage at Tornick bridge' }));
  await waitFor(() => expect(saveBlob).toHaveBeenCalledTimes(1));
  const [blob, name] = (saveBlob as jest.Mock).mock.calls[0] as [Blob, string];
  expect(blob.type).toContain('image/svg+xml');
  expect(name).toBe('run-3-stage-at-tornick-bridge-preliminary.svg');
});

test('names of pictures', () => {
  expect(pictureTitle('Long section. 6 h 00. Water 3 m')).toBe('Long section');
  expect(pictureName('Débit à Pont', { ...SOURCE, state: 'Signed' })).toBe(
    'run-3-debit-a-pont-signed',
  );
});
