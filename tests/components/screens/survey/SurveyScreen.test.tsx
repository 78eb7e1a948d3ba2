import { QueryClientProvider } from '@tanstack/react-query';
import { fireEvent, render, screen, waitFor } from '@testing-library/react';
import { CurrentStudyContext } from '@/components/layout/studyContext';
import { createQueryClient } from '@/components/queries/queryClient';
import { SurveyScreen } from '@/components/screens/survey/SurveyScreen';
import type { Study } from '@/shared/studies/types';
import type { SurveyFault, SurveyReading } from '@/shared/surveys/types';
import { plainSections } from '@/tests/helpers/plainSections';

jest.mock('expo-router', () => ({
  Link: ({ children }: { children: unknown }) => children,
  router: { push: jest.fn() },
  useLocalSearchParams: () => ({}),
}));
jest.mock('expo-router/head', () => ({ __esModule: true, default: () => null }));
jest.mock('expo-router/react-navigation', () => ({ useIsFocused: () => true }));

// Many roles are looked up in a large tree, which takes seconds on a busy machine.
jest.setTimeout(30_000);

/** Files arrive at once; how they do is tried in a real browser. */
jest.mock('@/components/queries/uploads', () => ({
  sendFile: async () => 41,
  forgetArrived: () => false,
  dropFile: () => undefined,
  useUploads: () => ({ data: [] }),
  useForgetUpload: () => ({}),
}));

const fault: SurveyFault = {
  sheet: 'Main',
  row: 218,
  lastRow: null,
  column: 'D',
  title: 'Elevation is missing',
  detail: 'Section XS-07, offset 41.2 m. Neighbours read 38.11 and 38.40.',
  severity: 'fault',
};
const headings = ['section', 'chainage', 'offset', 'elevation'] as const;
const reading = (faults: SurveyFault[]): SurveyReading => ({
  fileName: 'reach.xlsx',
  sheets: [
    {
      sheet: 'Main',
      layout: 'longTable',
      headingRow: 1,
      columns: headings.map((field, column) => ({
        column,
        heading: field.toUpperCase(),
        field,
        unit: column === 0 ? null : 'm',
        sample: ['1'],
      })),
    },
  ],
  decimal: 'point',
  sectionCount: 4,
  pointCount: 32,
  faults,
  faultsNotListed: 0,
  sections: faults.length > 0 ? [] : plainSections(),
});

let sent: { path: string; body: Record<string, unknown> }[];
function server(...answers: { status: number; body: unknown }[]) {
  sent = [];
  global.fetch = jest.fn(async (path: RequestInfo | URL, options?: RequestInit) => {
    const isList = options?.method === 'GET';
    if (!isList) sent.push({ path: String(path), body: JSON.parse(String(options?.body)) });
    const answer = isList
      ? { status: 200, body: { revisions: [], refusals: [] } }
      : answers.shift()!;
    return {
      ok: answer.status < 400,
      status: answer.status,
      json: async () => answer.body,
    } as Response;
  });
}
const row = (revision: number) => ({
  revision,
  fileName: 'reach.xlsx',
  sectionCount: 4,
  pointCount: 32,
  decision: { decision: 'accepted', remarks: '', by: 'Ines', at: '2026-12-01T08:00:00Z' },
});
const read = (faults: SurveyFault[] = []) => ({ status: 200, body: reading(faults) });

function open() {
  const study = { id: 3, title: 'Lower Veshall', may: [] } as unknown as Study;
  render(
    <QueryClientProvider client={createQueryClient()}>
      <CurrentStudyContext.Provider value={{ study, may: () => true }}>
        <SurveyScreen />
      </CurrentStudyContext.Provider>
    </QueryClientProvider>,
  );
}
const choose = (name = 'reach.xlsx', size = 1) => {
  const file = new File(['x'], name);
  Object.defineProperty(file, 'size', { value: size });
  fireEvent.change(document.querySelector('input[type=file]')!, { target: { files: [file] } });
};

describe('handing in a survey', () => {
  it('shows each fault with its place, and takes in the mended file with its note', async () => {
    server(read([fault]), read(), {
      status: 201,
      body: row(1),
    });
    open();
    choose();
    await screen.findByRole('heading', { name: 'Not taken in: 1 fault' });
    expect(screen.getByLabelText('Sheet Main, row 218, D')).toBeTruthy();
    expect(screen.getByText('Elevation is missing')).toBeTruthy();
    expect(screen.queryByText('Take in this survey')).toBeNull();

    choose();
    await screen.findByRole('heading', { name: 'Read without faults' });
    fireEvent.change(screen.getByRole('textbox', { name: /Note/ }), {
      target: { value: 'Bridge measured again.' },
    });
    fireEvent.click(screen.getByRole('button', { name: 'Take in this survey' }));
    await screen.findByText('Taken in as revision 1');
    expect(sent.map(({ path }) => path)).toEqual([
      '/api/studies/3/surveys/read',
      '/api/studies/3/surveys/read',
      '/api/studies/3/surveys',
    ]);
    expect(sent[2].body).toEqual({ uploadId: 41, note: 'Bridge measured again.' });
  });

  it('reads again with another match and sends that match along', async () => {
    server(read([fault]), read(), {
      status: 201,
      body: row(2),
    });
    open();
    choose();
    fireEvent.click(await screen.findByRole('button', { name: 'Change the match' }));
    fireEvent.change(screen.getByLabelText('ELEVATION means'), { target: { value: 'passedOver' } });
    await screen.findByRole('heading', { name: 'Read without faults' });
    fireEvent.click(screen.getByRole('button', { name: 'Take in this survey' }));
    await screen.findByText('Taken in as revision 2');
    const match = JSON.parse(String(sent[2].body['match']));
    expect(match.columns[3]).toEqual({ column: 3, field: null, unit: null });
    expect(sent[1].body['match']).toBe(sent[2].body['match']);
  });

  it('says what happened when the file cannot be read, and reads it again when asked to', async () => {
    server(
      { status: 422, body: { error: { code: 'timeout', message: 'Reading took too long.' } } },
      read(),
    );
    open();
    choose();
    await screen.findByText('Reading took too long.');
    fireEvent.click(screen.getByRole('button', { name: 'Try again' }));
    await screen.findByRole('heading', { name: 'Read without faults' });
  });

  it('does not send a file that is too large', async () => {
    server();
    open();
    choose('huge.xlsx', 21 * 1024 * 1024);
    await screen.findByText('huge.xlsx is too large');
    await waitFor(() => expect(sent).toEqual([]));
  });
});
