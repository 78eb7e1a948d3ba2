import { QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { act, renderHook, waitFor } from '@testing-library/react';
import type { ReactNode } from 'react';
import { ApiError } from '@/components/queries/ApiError';
import { api } from '@/components/queries/apiClient';
import { runKeys } from '@/components/queries/runs';
import { useRunEvents } from '@/components/queries/useRunEvents';
import type { RunEvent } from '@/shared/runs/types';

const progress = (share: number, stage: number[] | null): RunEvent => ({
  type: 'progress',
  state: 'running',
  progress: share,
  secondsLeft: 10,
  time: share * 1000,
  surface: stage && { chainages: [0, 100], bed: [1, 0], stage },
});
const ended: RunEvent = { type: 'ended', state: 'routed' };

/** Each call of the stream gives the next of these; an Error breaks the line. */
function streams(...lines: (RunEvent | Error)[][]) {
  return jest.spyOn(api, 'stream').mockImplementation(async function* () {
    for (const event of lines.shift() ?? []) {
      if (event instanceof Error) throw event;
      yield { event: 'message', data: JSON.stringify(event) };
    }
  });
}

function follow() {
  const client = new QueryClient();
  const invalidate = jest.spyOn(client, 'invalidateQueries');
  const wrapper = ({ children }: { children: ReactNode }) => (
    <QueryClientProvider client={client}>{children}</QueryClientProvider>
  );
  return { ...renderHook(() => useRunEvents(1, 12), { wrapper }), invalidate };
}

beforeEach(() => jest.useFakeTimers());
afterEach(() => {
  jest.useRealTimers();
  jest.restoreAllMocks();
});

test('keeps the water between events that bring none, and the highest of all', async () => {
  streams([progress(0.1, [3, 2]), progress(0.2, [2, 4]), progress(0.3, null), ended]);
  const { result, invalidate } = follow();
  await waitFor(() => expect(invalidate).toHaveBeenCalled());
  expect(result.current.progress?.progress).toBe(0.3);
  expect(result.current.progress?.surface?.stage).toEqual([2, 4]);
  expect(result.current.highest).toEqual([3, 4]);
  expect(invalidate).toHaveBeenCalledWith({ queryKey: runKeys.one(12) });
});

test('a broken line is said and taken up again, later each time', async () => {
  const stream = streams(
    [progress(0.1, null), ApiError.unreachable()],
    [ApiError.unreachable()],
    [progress(0.6, null), ended],
  );
  const { result, invalidate } = follow();
  await waitFor(() => expect(result.current.isLost).toBe(true));
  expect(stream).toHaveBeenCalledTimes(1);
  await act(() => jest.advanceTimersByTimeAsync(1000));
  expect(stream).toHaveBeenCalledTimes(2);
  await act(() => jest.advanceTimersByTimeAsync(1900));
  expect(stream).toHaveBeenCalledTimes(2);
  await act(() => jest.advanceTimersByTimeAsync(200));
  expect(stream).toHaveBeenCalledTimes(3);
  await waitFor(() => expect(invalidate).toHaveBeenCalled());
  expect(result.current).toMatchObject({ isLost: false, progress: { progress: 0.6 } });
});

test('a run that may no longer be seen is not asked for again', async () => {
  const stream = streams([new ApiError('notFound', 'Not there.')]);
  const { invalidate } = follow();
  await waitFor(() => expect(invalidate).toHaveBeenCalled());
  await act(() => jest.advanceTimersByTimeAsync(60_000));
  expect(stream).toHaveBeenCalledTimes(1);
});

test('leaving the screen ends it', async () => {
  const stream = streams([progress(0.1, null), ApiError.unreachable()], [ended]);
  const { result, unmount, invalidate } = follow();
  await waitFor(() => expect(result.current.isLost).toBe(true));
  unmount();
  await act(() => jest.advanceTimersByTimeAsync(60_000));
  expect(stream).toHaveBeenCalledTimes(1);
  expect(invalidate).not.toHaveBeenCalled();
});
