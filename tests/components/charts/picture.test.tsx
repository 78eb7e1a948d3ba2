import { fireEvent, render, screen, waitFor } from '@testing-library/react';
import { CurveSet } from '@/components/charts/CurveSet';
import { Hydrograph } from '@/components/charts/Hydrograph';
import { PictureProvider } from '@/components/charts/picture/pictureContext';
import { pictureName, pictureTitle } from '@/components/charts/picture/pictureName';
import { pictureOfRun, pictureOfRuns } from '@/components/charts/picture/pictureSources';
import { pictureSvg } from '@/components/charts/picture/pictureSvg';
import { COLOURS } from '@/components/theme/tokens';
import { saveBlob } from '@/components/queries/saveBlob';

jest.mock('@/components/queries/saveBlob', () => ({ saveBlob: jest.fn() }));

const SOURCE = pictureOfRun({
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

test('curves that are named below their drawing are named in its picture', async () => {
  const runs = [
    { number: 1, scenarioName: 'Design' },
    { number: 2, scenarioName: 'Larger' },
  ];
  render(
    <PictureProvider value={pictureOfRuns({ title: 'Lower Veshall' }, runs)}>
      <CurveSet
        label="Flow at Ebbick"
        curves={runs.map(({ scenarioName }, look) => ({
          name: scenarioName,
          x: [0, 3600],
          y: [10, 20 + look],
          look,
        }))}
        foot="time"
        value="flow"
        unitSystem="metric"
        initialWidth={352}
      />
    </PictureProvider>,
  );
  (saveBlob as jest.Mock).mockClear();
  fireEvent.click(screen.getByRole('button', { name: 'Picture of Flow at Ebbick' }));
  fireEvent.click(screen.getByRole('button', { name: 'SVG of Flow at Ebbick' }));
  await waitFor(() => expect(saveBlob).toHaveBeenCalledTimes(1));
  const [blob, name] = (saveBlob as jest.Mock).mock.calls[0] as [Blob, string];
  expect(name).toBe('runs-1-and-2-flow-at-ebbick-unsigned.svg');
  const picture = parse(await textOf(blob));
  const texts = [...picture.querySelectorAll('text')].map(({ textContent }) => textContent);
  expect(texts).toEqual(expect.arrayContaining(['Design', 'Larger', 'Lower Veshall']));
  // The drawing, and one swatch a curve.
  expect(picture.querySelectorAll('svg svg')).toHaveLength(3);
});

const textOf = (blob: Blob) =>
  new Promise<string>((resolve) => {
    const reader = new FileReader();
    reader.onload = () => resolve(reader.result as string);
    reader.readAsText(blob);
  });

test('names of pictures', () => {
  expect(pictureTitle('Long section. 6 h 00. Water 3 m')).toBe('Long section');
  expect(pictureName('Débit à Pont', { ...SOURCE, ending: 'signed' })).toBe(
    'run-3-debit-a-pont-signed',
  );
  const long = pictureName('Stage '.repeat(30), SOURCE);
  expect(long.length).toBeLessThanOrEqual(100);
  expect(long).toMatch(/-preliminary$/);
});
