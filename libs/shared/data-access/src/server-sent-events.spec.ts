import { ReadableStream } from 'node:stream/web';
import { TextDecoder, TextEncoder } from 'node:util';
import fc from 'fast-check';
import { readServerSentEvents, type ServerSentEvent } from './server-sent-events';

// The test's browser has no decoder of its own.
beforeAll(() => Object.assign(globalThis, { TextDecoder }));

const bytes = (text: string): Uint8Array => new TextEncoder().encode(text);

const streamOf = (chunks: readonly Uint8Array[]) =>
  new ReadableStream<Uint8Array>({
    start(controller) {
      chunks.forEach((chunk) => controller.enqueue(chunk));
      controller.close();
    },
  }) as unknown as globalThis.ReadableStream<Uint8Array>;

async function readAll(...chunks: readonly Uint8Array[]): Promise<ServerSentEvent[]> {
  const events: ServerSentEvent[] = [];
  for await (const event of readServerSentEvents(streamOf(chunks))) events.push(event);
  return events;
}
const message = (data: string): ServerSentEvent => ({ name: 'message', data });

describe('server-sent events', () => {
  it('have a name and data, and comments among them', async () => {
    const text = 'event: ready\ndata: {}\n\n: still here\n\nevent: changed\ndata: {"id":"7"}\n\n';
    expect(await readAll(bytes(text))).toEqual([
      { name: 'ready', data: '{}' },
      { name: 'changed', data: '{"id":"7"}' },
    ]);
  });

  it('are none without data, and none that was not ended', async () => {
    expect(await readAll(bytes('event: ready\n\ndata: half'))).toEqual([]);
  });

  it('are the same wherever the network cuts them, and whatever ends their lines', async () => {
    const word = fc.stringMatching(/^[^\r\n:]{0,12}$/u);
    const event = fc.record({ name: word, data: fc.array(word, { minLength: 1, maxLength: 3 }) });
    const ending = fc.constantFrom('\n', '\r\n', '\r');
    await fc.assert(
      fc.asyncProperty(fc.array(event, { minLength: 1 }), ending, fc.array(fc.nat()), async (events, end, cuts) => {
        const text = events
          .map(({ name, data }) => [`event: ${name}`, ...data.map((line) => `data: ${line}`), '', ''].join(end))
          .join('');
        const sent = bytes(`: hello${end}${end}${text}${end}`);
        const at = [0, ...cuts.map((cut) => cut % sent.length), sent.length].sort((one, other) => one - other);
        const chunks = at.slice(1).map((to, index) => sent.slice(at[index], to));
        expect(await readAll(...chunks)).toEqual(
          events.map(({ name, data }) => ({ name: name || 'message', data: data.join('\n') })),
        );
      }),
      { numRuns: 200 },
    );
  });

  it('let go of the stream when nobody reads on', async () => {
    let cancelled = false;
    const stream = new ReadableStream<Uint8Array>({
      start: (controller) => controller.enqueue(bytes('data: one\n\ndata: two\n\n')),
      cancel: () => void (cancelled = true),
    }) as unknown as globalThis.ReadableStream<Uint8Array>;
    const events = readServerSentEvents(stream);
    expect(await events.next()).toEqual({ done: false, value: message('one') });
    await events.return(undefined);
    expect(cancelled).toBe(true);
  });
});
