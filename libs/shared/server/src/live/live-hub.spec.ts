import { createServer, get, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import express from 'express';
import { newId } from '@seamwright/shared/util';
import { createTestDatabase, type TestDatabase } from '@seamwright/database/testing';
import { SetClock } from '../clock';
import { system, type Caller } from '../database/caller';
import { openDatabase, type Database } from '../database/database';
import { inTransaction } from '../database/in-transaction';
import { emit } from '../jobs/outbox';
import { drainOutbox } from '../jobs/drain';
import { createLog } from '../log';
import { LiveHub, mayHear } from './live-hub';

const mine = newId();
const theirs = newId();
const buyer: Caller = { kind: 'user', personId: newId(), roles: ['buyer'], customerId: mine, sites: '*' };
const staff = (customers: '*' | string[]): Caller => ({ kind: 'staff', personId: newId(), roles: ['rep'], customers });
const notice = (customerId: string | null) => ({ type: 'order-placed', subjectId: newId(), customerId });

const NOON = new Date('2026-12-01T12:00:00Z');

describe('mayHear', () => {
  it.each([
    [buyer, mine, true],
    [buyer, theirs, false],
    [buyer, null, false],
    [staff('*'), theirs, true],
    [staff([mine]), mine, true],
    [staff([mine]), theirs, false],
    [staff([mine]), null, true],
    [system('job'), mine, false],
    [{ kind: 'anonymous' } as const, mine, false],
  ])('%j of %s: %s', (caller, customerId, expected) => {
    expect(mayHear(caller, notice(customerId))).toBe(expected);
  });
});

describe('the live hub', () => {
  let urls: TestDatabase;
  let database: Database;
  let hub: LiveHub;
  let server: Server;
  const log = createLog('silent', 'test');

  beforeAll(async () => {
    urls = await createTestDatabase();
    database = openDatabase(urls.workerUrl, { max: 2 });
    hub = new LiveHub(urls.appUrl, log);
    await hub.start();
    const app = express();
    app.get('/live', (request, response) => hub.attach(buyer, request, response));
    server = createServer(app).listen(0, '127.0.0.1');
    await new Promise((resolve) => server.once('listening', resolve));
  });
  afterAll(async () => {
    await hub.close();
    server.closeAllConnections();
    await new Promise((resolve) => server.close(resolve));
    await database.close();
    await urls.drop();
  });

  it('tells a buyer of what happened to her own customer, with ids only', async () => {
    const subjectId = newId();
    let telling: Promise<void> | undefined;
    const heard = new Promise<string>((resolve, reject) => {
      let text = '';
      const { port } = server.address() as AddressInfo;
      get({ host: '127.0.0.1', port, path: '/live' }, (response) => {
        response.on('data', (chunk: Buffer) => {
          text += chunk.toString();
          if (text.includes('event: ready')) telling ??= tell();
          if (text.includes(subjectId)) resolve(text);
        });
      }).on('error', reject);
    });
    const tell = async () => {
      await inTransaction(database, system('job'), (tx) =>
        emit(
          tx,
          NOON,
          { type: 'order-placed', subjectId: newId(), customerId: theirs, payload: { secret: 'theirs' } },
          { type: 'order-packed', subjectId, customerId: mine, payload: { secret: 'mine' } },
        ),
      );
      await drainOutbox({ database, clock: new SetClock(NOON), log }, []);
    };
    const text = await heard;
    await telling;
    expect(text).toContain(`data: {"type":"order-packed","id":"${subjectId}"}`);
    expect(text).not.toContain('order-placed');
    expect(text).not.toContain('secret');
  });
});
