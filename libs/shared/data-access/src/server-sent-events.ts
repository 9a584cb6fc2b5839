export interface ServerSentEvent {
  readonly name: string;
  readonly data: string;
}

/** Reads a stream of server-sent events (WHATWG HTML, section 9.2) as they come in; comments are passed over. */
export async function* readServerSentEvents(body: ReadableStream<Uint8Array>): AsyncGenerator<ServerSentEvent> {
  const reader = body.getReader();
  const decoder = new TextDecoder();
  let waiting = '';
  let lines: string[] = [];
  try {
    for (;;) {
      const { done, value } = await reader.read();
      // What was not ended by an empty line is no event.
      if (done) return;
      const read = splitLines(waiting + decoder.decode(value, { stream: true }));
      waiting = read.rest;
      for (const line of read.lines) {
        if (line !== '') {
          lines.push(line);
          continue;
        }
        const event = readBlock(lines);
        lines = [];
        if (event) yield event;
      }
    }
  } finally {
    await reader.cancel().catch(() => undefined);
  }
}

/** A line ends with CR LF, LF or CR; a CR at the very end may be half of the first. */
function splitLines(text: string): { readonly lines: string[]; readonly rest: string } {
  const lines = text.split(/\r\n|\n|\r(?!$)/);
  return { rest: lines.pop() ?? '', lines };
}

function readBlock(lines: readonly string[]): ServerSentEvent | null {
  let name = '';
  const data: string[] = [];
  for (const line of lines) {
    const { field, value } = readLine(line);
    if (field === 'event') name = value;
    if (field === 'data') data.push(value);
  }
  return data.length > 0 ? { name: name || 'message', data: data.join('\n') } : null;
}

/** One space after the colon belongs to neither; a comment has no field's name. */
function readLine(line: string): { readonly field: string; readonly value: string } {
  const colon = line.indexOf(':');
  if (colon < 0) return { field: line, value: '' };
  return { field: line.slice(0, colon), value: line.slice(colon + 1).replace(/^ /, '') };
}
