import { useMutation, useQuery, useQueryClient, type QueryClient } from '@tanstack/react-query';
import type {
  AnswersBody,
  IssueBody,
  PointBody,
  ReasonBody,
  SendForCheckBody,
  SignBody,
} from '@/shared/review/schemas';
import type { QueueRow, Recipient, Review } from '@/shared/review/types';
import { api } from './apiClient';
import { issuedKeys } from './issued';
import { reportKeys } from './reports';
import { isUnfinished, runKeys } from './runs';

export const reviewKeys = {
  all: ['reviews'] as const,
  of: (runId: number) => [...reviewKeys.all, 'ofRun', runId] as const,
  queue: () => [...reviewKeys.all, 'queue'] as const,
  recipients: () => [...reviewKeys.all, 'recipients'] as const,
};

const LOOK_AGAIN_MS = 3000;

/** The checking of a run; looked at again while the run that shows the outlet's influence is under way. */
export const useReview = (runId: number) =>
  useQuery({
    queryKey: reviewKeys.of(runId),
    queryFn: ({ signal }) => api.get<Review>(`/runs/${runId}/review`, { signal }),
    refetchInterval: ({ state }) => (isProbing(state.data) ? LOOK_AGAIN_MS : false),
  });

const isProbing = (review: Review | undefined): boolean =>
  review?.outletProbe !== null &&
  review?.outletProbe !== undefined &&
  isUnfinished({ state: review.outletProbe.state as 'queued' });

/** What waits for this senior engineer, oldest first. */
export const useCheckQueue = (enabled = true) =>
  useQuery({
    queryKey: reviewKeys.queue(),
    queryFn: ({ signal }) => api.get<QueueRow[]>('/reviews/queue', { signal }),
    enabled,
  });

/** Senior engineers that may check what this person ran. */
export const useRecipients = () =>
  useQuery({
    queryKey: reviewKeys.recipients(),
    queryFn: ({ signal }) => api.get<Recipient[]>('/reviews/recipients', { signal }),
  });

/** One step of the checking; whatever shows its state is read anew before it counts as done. */
function useReviewStep<V>(runId: number, step: (value: V) => Promise<unknown>) {
  const client = useQueryClient();
  return useMutation({ mutationFn: step, onSettled: () => reviewChanged(client, runId) });
}

const reviewChanged = (client: QueryClient, runId: number) =>
  Promise.all([
    client.invalidateQueries({ queryKey: reviewKeys.all }),
    client.invalidateQueries({ queryKey: runKeys.one(runId), exact: true }),
    client.invalidateQueries({ queryKey: [...runKeys.all, 'ofStudy'] }),
    client.invalidateQueries({ queryKey: reportKeys.of(runId) }),
    client.invalidateQueries({ queryKey: issuedKeys.all }),
  ]);

export const useSendForCheck = (runId: number) =>
  useReviewStep(runId, (body: SendForCheckBody) => api.post(`/runs/${runId}/review`, body));

export const useAnswerItems = (runId: number) =>
  useReviewStep(runId, (body: AnswersBody) => api.put(`/runs/${runId}/review/answers`, body));

export const useRaisePoint = (runId: number) =>
  useReviewStep(runId, (body: PointBody) => api.post(`/runs/${runId}/review/points`, body));

export type PointStep = 'answer' | 'close' | 'reopen';

export const usePointStep = (runId: number, pointId: number) =>
  useReviewStep(runId, ({ step, text }: { step: PointStep; text: string }) =>
    api.post(`/points/${pointId}/${step}`, { text }),
  );

export const useReturnRun = (runId: number) =>
  useReviewStep(runId, (body: ReasonBody) => api.post(`/runs/${runId}/review/return`, body));

export const useSignRun = (runId: number) =>
  useReviewStep(runId, (body: SignBody) => api.post(`/runs/${runId}/review/sign`, body));

export const useIssueRun = (runId: number) =>
  useReviewStep(runId, (body: IssueBody) => api.post(`/runs/${runId}/review/issue`, body));

export const useWithdrawRun = (runId: number) =>
  useReviewStep(runId, (body: ReasonBody) => api.post(`/runs/${runId}/review/withdraw`, body));

/** Asks for the second run with a changed outlet. */
export const useOutletProbe = (runId: number) =>
  useReviewStep(runId, () => api.post(`/runs/${runId}/review/outlet-probe`));
