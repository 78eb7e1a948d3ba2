/** One server-sent event (HTML standard, section 9.2). */
export interface ServerEvent {
  event: string;
  data: string;
}

/** Reads a text/event-stream as it comes; ends with the stream, throws what the stream throws. */
export async function* readServerEvents(
  body: ReadableStream<Uint8Array>,
): AsyncGenerator<ServerEvent> {
  const reader = body.getReader();
  const decoder = new TextDecoder();
  let rest = '';
  try {
    for (;;) {
      const { done, value } = await reader.read();
      if (done) return;
      rest += decoder.decode(value, { stream: true });
      const blocks = rest.split(/\r?\n\r?\n/);
      rest = blocks.pop() ?? '';
      for (const block of blocks) {
        const parsed = parseBlock(block);
        if (parsed) yield parsed;
      }
    }
  } finally {
    await reader.cancel().catch(() => undefined);
  }
}

/** Null for comments, which only keep the connection open. */
function parseBlock(block: string): ServerEvent | null {
  let event = 'message';
  const data: string[] = [];
  for (const line of block.split(/\r?\n/)) {
    if (line.startsWith('event:')) event = line.slice(6).trim();
    else if (line.startsWith('data:')) data.push(line.slice(5).replace(/^ /, ''));
  }
  return data.length > 0 ? { event, data: data.join('\n') } : null;
}
