export interface ServerSentEvent {
  readonly name: string;
  readonly data: string;
}

/** Reads a stream of server-sent events (WHATWG HTML, section 9.2) as they come in; comments are passed over. */
export async function* readServerSentEvents(body: ReadableStream<Uint8Array>): AsyncGenerator<ServerSentEvent> {
  const reader = body.getReader();
  const decoder = new TextDecoder();
  let waiting = '';
  for (;;) {
    const { done, value } = await reader.read();
    if (done) return;
    waiting += decoder.decode(value, { stream: true });
    const blocks = waiting.split('\n\n');
    waiting = blocks.pop() ?? '';
    for (const block of blocks) {
      const event = readBlock(block);
      if (event) yield event;
    }
  }
}

function readBlock(block: string): ServerSentEvent | null {
  let name = 'message';
  const data: string[] = [];
  for (const line of block.split('\n')) {
    if (line.startsWith('event:')) name = line.slice(6).trim();
    else if (line.startsWith('data:')) data.push(line.slice(5).trimStart());
  }
  return data.length > 0 ? { name, data: data.join('\n') } : null;
}
