import type { RunEvent } from '../../../shared/runs/types';

export interface EventReader {
  status: number;
  headers: Headers;
  events: RunEvent[];
  /** Wall time at which each came, ms. */
  at: number[];
  /** Resolves when the server has closed the stream, or `close` was called. */
  closed: Promise<void>;
  close: () => void;
}

/** Reads a stream of events as a browser does: with fetch and the token in a heading. */
export async function readEvents(url: string, token: string): Promise<EventReader> {
  const abort = new AbortController();
  const response = await fetch(url, {
    headers: { Authorization: `Bearer ${token}`, 'Accept-Encoding': 'gzip' },
    signal: abort.signal,
  });
  const reader: EventReader = {
    status: response.status,
    headers: response.headers,
    events: [],
    at: [],
    closed: Promise.resolve(),
    close: () => abort.abort(),
  };
  reader.closed = drain(response, reader).catch((error: unknown) => {
    if (!abort.signal.aborted) throw error;
  });
  return reader;
}

async function drain(response: Response, { events, at }: EventReader): Promise<void> {
  let text = '';
  const decoder = new TextDecoder();
  for await (const piece of response.body ?? []) {
    text += decoder.decode(piece, { stream: true });
    const whole = text.split('\n\n');
    text = whole.pop()!;
    for (const message of whole) {
      if (!message.startsWith('data: ')) continue;
      events.push(JSON.parse(message.slice('data: '.length)) as RunEvent);
      at.push(Date.now());
    }
  }
}
