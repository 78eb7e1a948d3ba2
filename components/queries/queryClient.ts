import { QueryClient } from '@tanstack/react-query';
import { ApiError } from './ApiError';

/** Answers that another try may change; the rest is told at once. */
const mayPass = (error: unknown) =>
  error instanceof ApiError && (error.code === 'unreachable' || error.code === 'unavailable');

export const createQueryClient = () =>
  new QueryClient({
    defaultOptions: {
      queries: {
        staleTime: 20_000,
        retry: (count, error) => mayPass(error) && count < 2,
        refetchOnWindowFocus: true,
      },
      mutations: { retry: false },
    },
  });
