import { getAccessToken, renewInFlight } from './accessToken';
import { ApiError } from './ApiError';
import { fileNameOf, saveBlob } from './saveBlob';
import { readServerEvents, type ServerEvent } from './serverEvents';

interface CallOptions {
  signal?: AbortSignal;
  /** Appended to the path; undefined and null are left out. */
  query?: Record<string, string | number | undefined | null>;
}

type Method = 'GET' | 'POST' | 'PATCH' | 'PUT' | 'DELETE';

function address(path: string, query: CallOptions['query'] = {}): string {
  const pairs = Object.entries(query).flatMap(([key, value]) =>
    value === undefined || value === null ? [] : [[key, String(value)]],
  );
  const search = pairs.length > 0 ? `?${new URLSearchParams(pairs)}` : '';
  return `/api${path}${search}`;
}

async function send(method: Method, path: string, body: unknown, options: CallOptions) {
  const token = getAccessToken();
  const isForm = body instanceof FormData;
  const headers: Record<string, string> = {};
  if (token) headers.Authorization = `Bearer ${token}`;
  if (body !== undefined && !isForm) headers['Content-Type'] = 'application/json';
  try {
    return await fetch(address(path, options.query), {
      method,
      headers,
      body: isForm ? body : body === undefined ? undefined : JSON.stringify(body),
      signal: options.signal,
    });
  } catch (error) {
    if (options.signal?.aborted) throw error;
    throw ApiError.unreachable();
  }
}

/** Calls; when the access token has run out, renews it once and calls again. Throws ApiError. */
async function call(method: Method, path: string, body?: unknown, options: CallOptions = {}) {
  const hadToken = getAccessToken() !== null;
  let response = await send(method, path, body, options);
  if (response.status === 401 && hadToken) {
    await renewInFlight();
    response = await send(method, path, body, options);
  }
  if (!response.ok) throw await ApiError.of(response);
  return response;
}

async function json<T>(method: Method, path: string, body?: unknown, options?: CallOptions) {
  const response = await call(method, path, body, options);
  const hasBody = response.status !== 204 && response.status !== 202;
  return (hasBody ? await response.json() : undefined) as T;
}

/** The only door to the server. Paths begin behind `/api`; the caller names the type of the answer. */
export const api = {
  get: <T>(path: string, options?: CallOptions) => json<T>('GET', path, undefined, options),
  post: <T>(path: string, body?: unknown, options?: CallOptions) =>
    json<T>('POST', path, body, options),
  patch: <T>(path: string, body: unknown, options?: CallOptions) =>
    json<T>('PATCH', path, body, options),
  put: <T>(path: string, body: unknown, options?: CallOptions) =>
    json<T>('PUT', path, body, options),
  delete: <T = void>(path: string, options?: CallOptions) =>
    json<T>('DELETE', path, undefined, options),

  /** Multipart; the browser sets the boundary. */
  upload: <T>(path: string, form: FormData, options?: CallOptions) =>
    json<T>('POST', path, form, options),

  /** A binary block. */
  async bytes(path: string, options?: CallOptions): Promise<ArrayBuffer> {
    return (await call('GET', path, undefined, options)).arrayBuffer();
  },

  /** Saves the answer as a file under the name the server gives it. */
  async download(path: string, fallbackName: string, options?: CallOptions): Promise<void> {
    const response = await call('GET', path, undefined, options);
    const name = fileNameOf(response.headers.get('Content-Disposition')) ?? fallbackName;
    saveBlob(await response.blob(), name);
  },

  /** Server-sent events, until the server or the signal ends them. */
  async *stream(path: string, options?: CallOptions): AsyncGenerator<ServerEvent> {
    const response = await call('GET', path, undefined, options);
    if (response.body) yield* readServerEvents(response.body);
  },
};
