import { ReadableStream, type ReadableStreamDefaultController } from 'node:stream/web';
import { TextDecoder, TextEncoder } from 'node:util';
import { DOCUMENT } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { ACCESS_TOKEN_SOURCE } from './access-token';
import { LiveEvents, type LiveChange } from './live-events';

/** One answer of the server that stays open until it is ended. */
class FakeStream {
  #controller!: ReadableStreamDefaultController<Uint8Array>;
  readonly body = new ReadableStream<Uint8Array>({ start: (controller) => void (this.#controller = controller) });
  readonly response = { ok: true, body: this.body };

  send(text: string): void {
    this.#controller.enqueue(new TextEncoder().encode(text));
  }

  changed(type: string, id: string): void {
    this.send(`event: changed\ndata: ${JSON.stringify({ type, id })}\n\n`);
  }

  end(): void {
    this.#controller.close();
  }
}

/** The channel that tabs share: each hears the others, not itself. */
class FakeChannel {
  static open: FakeChannel[] = [];
  onmessage: ((message: { data: unknown }) => void) | null = null;

  constructor(readonly name: string) {
    FakeChannel.open.push(this);
  }

  postMessage(data: unknown): void {
    for (const other of FakeChannel.open.filter((each) => each !== this && each.name === this.name))
      other.onmessage?.({ data });
  }

  close(): void {
    FakeChannel.open = FakeChannel.open.filter((each) => each !== this);
  }
}

/** Gives a lock to the first who asks, and to the next when the first is done. */
class FakeLocks {
  readonly #held = new Map<string, Promise<unknown>>();

  request(name: string, _options: object, work: () => Promise<unknown>): Promise<unknown> {
    const turn = (this.#held.get(name) ?? Promise.resolve()).then(work);
    this.#held.set(name, turn);
    return turn;
  }
}

let token: string | null;
let answers: (FakeStream | Error | { ok: false })[];
let asked: { address: string; authorization: string }[];

beforeEach(() => {
  jest.useFakeTimers();
  token = 'token-1';
  answers = [];
  asked = [];
  FakeChannel.open = [];
  const fetch = async (address: string, { headers }: { headers: { authorization: string } }) => {
    asked.push({ address, authorization: headers.authorization });
    const answer = answers.shift() ?? new FakeStream();
    if (answer instanceof Error) throw answer;
    return answer instanceof FakeStream ? answer.response : answer;
  };
  // The test's browser has none of these.
  Object.assign(globalThis, { fetch, BroadcastChannel: FakeChannel, TextDecoder });
  Object.defineProperty(navigator, 'locks', { value: new FakeLocks(), configurable: true });
});

afterEach(() => {
  jest.useRealTimers();
  Reflect.deleteProperty(globalThis, 'BroadcastChannel');
  Reflect.deleteProperty(navigator, 'locks');
});

/** A tab of an application; each has its own services. */
function openTab(base = 'http://127.0.0.1/'): LiveEvents {
  TestBed.resetTestingModule();
  TestBed.configureTestingModule({
    teardown: { destroyAfterEach: false },
    providers: [
      { provide: ACCESS_TOKEN_SOURCE, useValue: { current: () => token } },
      { provide: DOCUMENT, useValue: { baseURI: base } },
    ],
  });
  return TestBed.inject(LiveEvents);
}

function heard(tab: LiveEvents, ...types: string[]): LiveChange[] {
  const changes: LiveChange[] = [];
  tab.changes(...types).subscribe((change) => changes.push(change));
  return changes;
}

/** Lets everything that is under way come to rest, `ms` later. */
const later = (ms = 0): Promise<void> => jest.advanceTimersByTimeAsync(ms);

const again: LiveChange = { type: 'again', id: '' };

describe('live changes', () => {
  it('are read under one’s own token, and heard by type', async () => {
    const stream = new FakeStream();
    answers = [stream];
    const orders = heard(openTab(), 'order-changed', 'order-placed');
    await later();
    stream.send('event: ready\ndata: {}\n\n: still here\n\n');
    stream.changed('order-changed', '7');
    stream.changed('lot-changed', '8');
    stream.changed('order-placed', '9');
    await later();
    expect(asked).toEqual([{ address: '/api/v1/live', authorization: 'Bearer token-1' }]);
    expect(orders).toEqual([
      { type: 'order-changed', id: '7' },
      { type: 'order-placed', id: '9' },
    ]);
  });

  it('say that anything may have changed after the stream was lost and found, and when the server says so', async () => {
    const [first, second] = [new FakeStream(), new FakeStream()];
    answers = [first, second];
    const changes = heard(openTab(), 'order-changed');
    await later();
    expect(changes).toEqual([]);
    first.end();
    await later(2_999);
    expect(asked).toHaveLength(1);
    token = 'token-2';
    await later(1);
    expect(asked[1]?.authorization).toBe('Bearer token-2');
    expect(changes).toEqual([again]);
    second.send('event: again\ndata: {}\n\n');
    await later();
    expect(changes).toEqual([again, again]);
  });

  it('are asked for again after the server was not reached, refused, or told nonsense', async () => {
    const [nonsense, good] = [new FakeStream(), new FakeStream()];
    answers = [new Error('not reached'), { ok: false }, nonsense, good];
    const changes = heard(openTab(), 'order-changed');
    await later(6_000);
    nonsense.send('event: changed\ndata: {"type":\n\n');
    await later(3_000);
    good.changed('order-changed', '7');
    await later();
    expect(asked).toHaveLength(4);
    expect(changes).toEqual([again, again, { type: 'order-changed', id: '7' }]);
  });

  it('wait for a sign-in', async () => {
    token = null;
    const changes = heard(openTab(), 'order-changed');
    await later(9_000);
    expect(asked).toEqual([]);
    token = 'token-1';
    await later(3_000);
    expect(asked).toHaveLength(1);
    expect(changes).toEqual([]);
  });

  it('come by one stream for all who listen', async () => {
    const tab = openTab();
    heard(tab, 'order-changed');
    heard(tab, 'lot-changed');
    await later();
    expect(asked).toHaveLength(1);
  });
});

describe('live changes in several tabs', () => {
  it('are read by one and passed on to the others', async () => {
    const stream = new FakeStream();
    answers = [stream];
    const mine = heard(openTab(), 'order-changed');
    const other = heard(openTab(), 'order-changed');
    await later();
    stream.changed('order-changed', '7');
    await later();
    expect(asked).toHaveLength(1);
    expect([mine, other]).toEqual([[{ type: 'order-changed', id: '7' }], [{ type: 'order-changed', id: '7' }]]);
  });

  it('are read by another tab when the one that read is closed', async () => {
    const [first, second] = [new FakeStream(), new FakeStream()];
    answers = [first, second];
    const reading = openTab();
    heard(reading, 'order-changed');
    const other = heard(openTab(), 'order-changed');
    await later();
    reading.ngOnDestroy();
    first.end();
    await later();
    second.changed('order-changed', '7');
    await later();
    expect(asked).toHaveLength(2);
    expect(other).toEqual([{ type: 'order-changed', id: '7' }]);
    expect(FakeChannel.open).toHaveLength(1);
  });

  it('are kept apart from the other application’s, whose people hear other things', async () => {
    const [shop, desk] = [new FakeStream(), new FakeStream()];
    answers = [shop, desk];
    const buyers = heard(openTab('http://127.0.0.1/'), 'order-changed');
    const staff = heard(openTab('http://127.0.0.1/admin/'), 'order-changed');
    await later();
    desk.changed('order-changed', '7');
    await later();
    expect(asked).toHaveLength(2);
    expect([buyers, staff]).toEqual([[], [{ type: 'order-changed', id: '7' }]]);
  });

  it('are done without where the browser can’t share a lock', async () => {
    Reflect.deleteProperty(navigator, 'locks');
    Reflect.deleteProperty(globalThis, 'BroadcastChannel');
    const changes = heard(openTab(), 'order-changed');
    await later(9_000);
    expect([asked, changes]).toEqual([[], []]);
  });
});
