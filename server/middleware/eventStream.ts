import type { Response } from 'express';

export interface EventStream {
  send: (data: object) => void;
  /** Whether what was sent waits for a slow reader. */
  isBehind: () => boolean;
  close: () => void;
}

const HEARTBEAT_MILLISECONDS = 15_000;

/**
 * Opens a stream of server-sent events (HTML Living Standard, 9.2). It is neither kept nor compressed on the way, so
 * that each event leaves at once; comments tell proxies that it lives. `closed` runs once, whoever ends it.
 */
export function eventStream(res: Response, closed: () => void): EventStream {
  res.status(200).set({
    'Content-Type': 'text/event-stream; charset=utf-8',
    'Cache-Control': 'no-store, no-transform',
    'X-Accel-Buffering': 'no',
  });
  res.flushHeaders();
  const heartbeat = setInterval(() => res.write(': still here\n\n'), HEARTBEAT_MILLISECONDS);
  res.once('close', () => {
    clearInterval(heartbeat);
    closed();
  });
  return {
    send: (data) => void res.write(`data: ${JSON.stringify(data)}\n\n`),
    isBehind: () => res.writableNeedDrain,
    close: () => void res.end(),
  };
}
