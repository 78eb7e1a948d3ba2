import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { Upload, type DetailedError } from 'tus-js-client';
import { LIMITS } from '@/shared/limits';
import type { ErrorBody } from '@/shared/errors';
import type { UploadRow } from '@/shared/uploads/types';
import { getAccessToken, renewInFlight } from './accessToken';
import { api } from './apiClient';
import { ApiError } from './ApiError';

/** How far a file has come. */
export interface Transfer {
  /** Bytes that the server has. */
  arrived: number;
  size: number;
  /** There is no connection; it goes on by itself. */
  waiting: boolean;
}

interface SendOptions {
  signal?: AbortSignal;
  onTransfer: (transfer: Transfer) => void;
}

/** ms between two tries; the last is kept to. */
const PAUSES = [500, 1000, 2000, 5000, 10_000];

/** Files of this page that have arrived whole, and where. */
const arrived = new WeakMap<File, number>();

export const forgetArrived = (file: File): boolean => arrived.delete(file);

/** Lets the server forget a file that is not handed in after all; where that fails it does so by itself in a day. */
export function dropFile(file: File): void {
  const id = arrived.get(file);
  arrived.delete(file);
  if (id !== undefined) void api.delete(`/uploads/${id}`).catch(() => undefined);
}

/**
 * Sends a file part by part, and goes on where it stopped: after a lost connection by itself, after a reload when the
 * same file is chosen again. Gives the id of the upload. Throws ApiError where the server refuses it.
 */
export async function sendFile(studyId: number, file: File, options: SendOptions): Promise<number> {
  const known = arrived.get(file);
  if (known !== undefined) return known;
  const id = await transfer(studyId, file, options);
  arrived.set(file, id);
  return id;
}

function transfer(studyId: number, file: File, { signal, onTransfer }: SendOptions) {
  return new Promise<number>((resolve, reject) => {
    let sent = 0;
    let failures = 0;
    let renewed = false;
    const { size } = file;
    const tell = (waiting: boolean) => onTransfer({ arrived: sent, size, waiting });

    const upload = new Upload(file, {
      endpoint: `/api/studies/${studyId}/uploads`,
      chunkSize: LIMITS.upload.partBytes,
      // Tries are made here, so that the person sees what is waited for.
      retryDelays: null,
      metadata: { filename: file.name },
      removeFingerprintOnSuccess: true,
      fingerprint: () => fingerprintOf(studyId, file),
      onBeforeRequest: (request) => {
        const token = getAccessToken();
        if (token) request.setHeader('Authorization', `Bearer ${token}`);
      },
      onChunkComplete: (_part, bytes) => {
        sent = bytes;
        failures = 0;
        renewed = false;
        tell(false);
      },
      onError: (error) => void mend(error as DetailedError).catch(reject),
      onSuccess: () => resolve(Number(upload.url!.split('/').at(-1))),
    });
    signal?.addEventListener('abort', () => {
      void upload.abort();
      reject(signal.reason);
    });

    async function mend(error: DetailedError): Promise<void> {
      if (signal?.aborted) return;
      const status = error.originalResponse?.getStatus() ?? 0;
      if (status === 401 && !renewed) {
        renewed = true;
        await renewInFlight();
        return upload.start();
      }
      // No answer, one of a server that is not ready, or a part that had arrived already.
      const passes = status === 0 || status >= 500 || status === 409 || status === 423;
      if (!passes) throw refusalOf(error);
      tell(true);
      await connected(PAUSES[Math.min(failures++, PAUSES.length - 1)], signal);
      if (!signal?.aborted) upload.start();
    }

    tell(false);
    upload
      .findPreviousUploads()
      .then(([previous]) => {
        if (signal?.aborted) return;
        if (previous) upload.resumeFromPreviousUpload(previous);
        upload.start();
      })
      .catch(reject);
  });
}

/**
 * By what a file is known again after a reload: its content, for phones tell another date of it each time it is chosen.
 * Where the page may not hash (no secure connection) its date must do.
 */
async function fingerprintOf(studyId: number, file: File): Promise<string> {
  const content = crypto.subtle
    ? [...new Uint8Array(await crypto.subtle.digest('SHA-256', await file.arrayBuffer()))]
        .map((byte) => byte.toString(16).padStart(2, '0'))
        .join('')
    : String(file.lastModified);
  return ['spate', studyId, file.name, file.size, content].join('-');
}

function refusalOf(error: DetailedError): ApiError {
  try {
    const body = JSON.parse(error.originalResponse!.getBody()) as ErrorBody;
    return new ApiError(body.error.code, body.error.message, body.error.faults);
  } catch {
    return new ApiError('invalid', 'The file was not taken. Choose it again.');
  }
}

/** After a pause, and not before the device is connected again. */
function connected(pause: number, signal?: AbortSignal): Promise<void> {
  return new Promise((resolve) => {
    const done = () => {
      window.removeEventListener('online', done);
      resolve();
    };
    signal?.addEventListener('abort', done);
    window.addEventListener('online', done);
    setTimeout(() => {
      if (navigator.onLine) done();
    }, pause);
  });
}

const keyOf = (studyId: number) => ['uploads', studyId] as const;

/** One's own files that are not read yet. */
export const useUploads = (studyId: number) =>
  useQuery({
    queryKey: keyOf(studyId),
    queryFn: ({ signal }) => api.get<UploadRow[]>(`/studies/${studyId}/uploads`, { signal }),
    staleTime: 0,
  });

export function useForgetUpload(studyId: number) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (id: number) => api.delete(`/uploads/${id}`),
    onSettled: () => client.invalidateQueries({ queryKey: keyOf(studyId) }),
  });
}
