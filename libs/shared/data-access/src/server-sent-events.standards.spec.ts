import { ReadableStream } from 'node:stream/web';
import { TextDecoder, TextEncoder } from 'node:util';
import { readServerSentEvents } from './server-sent-events';

// The test's browser has no decoder of its own.
beforeAll(() => Object.assign(globalThis, { TextDecoder }));

async function dataOf(text: string): Promise<string[]> {
  const stream = new ReadableStream<Uint8Array>({
    start(controller) {
      controller.enqueue(new TextEncoder().encode(text));
      controller.close();
    },
  });
  const data: string[] = [];
  for await (const event of readServerSentEvents(stream as unknown as globalThis.ReadableStream<Uint8Array>))
    data.push(event.data);
  return data;
}

// Source: the WHATWG HTML standard, section 9.2.6 "Interpreting an event stream", whose examples these are; from memory.
describe('the examples of the standard for an event stream', () => {
  it('one space after the colon is passed over, a second is not', async () => {
    expect(
      await dataOf(': test stream\n\ndata: first event\nid: 1\n\ndata:second event\nid\n\ndata:  third event\n\n'),
    ).toEqual(['first event', 'second event', ' third event']);
    expect(await dataOf('data:test\n\ndata: test\n\n')).toEqual(['test', 'test']);
  });

  it('a field without a colon is empty, and what is not ended by an empty line is dropped', async () => {
    expect(await dataOf('data\n\ndata\ndata\n\ndata:')).toEqual(['', '\n']);
  });
});
