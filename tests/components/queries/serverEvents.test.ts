import { ReadableStream } from 'node:stream/web';
import { TextDecoder, TextEncoder } from 'node:util';
import { readServerEvents, type ServerEvent } from '@/components/queries/serverEvents';

Object.assign(global, { TextDecoder });

async function read(chunks: (string | Uint8Array)[]): Promise<ServerEvent[]> {
  const encoder = new TextEncoder();
  const body = new ReadableStream<Uint8Array>({
    start(controller) {
      for (const chunk of chunks)
        controller.enqueue(typeof chunk === 'string' ? encoder.encode(chunk) : chunk);
      controller.close();
    },
  });
  const events: ServerEvent[] = [];
  for await (const event of readServerEvents(
    body as unknown as globalThis.ReadableStream<Uint8Array>,
  ))
    events.push(event);
  return events;
}

test('events are read however the network cuts them', async () => {
  const events = await read([
    'event: prog',
    'ress\ndata: {"p":',
    '0.5}\n',
    '\ndata: two\ndata: lines\n\n',
  ]);
  expect(events).toEqual([
    { event: 'progress', data: '{"p":0.5}' },
    { event: 'message', data: 'two\nlines' },
  ]);
});

test('comments keep the line open and say nothing; CRLF is a line end too', async () => {
  expect(await read([': still here\n\n', 'data: a\r\n\r\n'])).toEqual([
    { event: 'message', data: 'a' },
  ]);
});

test('a letter cut in the middle of its bytes is read whole', async () => {
  const bytes = new TextEncoder().encode('data: m³/s\n\n');
  expect(await read([bytes.slice(0, 8), bytes.slice(8)])).toEqual([
    { event: 'message', data: 'm³/s' },
  ]);
});
