import { createConnection } from 'node:net';
import { createTransport, type SendMailOptions } from 'nodemailer';
import request from 'supertest';
import { createMailCatcher, type ListeningMailCatcher, type MailCatcher } from './index';
import { CAPACITY } from './mailbox';

const ARRIVED = new Date('2026-03-02T09:00:00Z');
let catcher: MailCatcher;
let listening: ListeningMailCatcher;

beforeEach(async () => {
  catcher = createMailCatcher({ now: () => ARRIVED });
  listening = await catcher.listen({ smtpPort: 0, httpPort: 0 });
});
afterEach(() => listening.close());

async function send(mail: SendMailOptions): Promise<void> {
  const transport = createTransport({ host: '127.0.0.1', port: listening.smtpPort, secure: false });
  await transport.sendMail({ from: 'Seamwright <desk@seamwright.example>', ...mail });
  transport.close();
}
const get = (path: string) => request(listening.url).get(path);
const newest = async () => (await get('/api/messages')).body.messages[0];

const invoice: SendMailOptions = {
  to: 'Kitchen <kitchen@fold.example>',
  bcc: 'accounts@seamwright.example',
  subject: 'Invoice 1001 – £42.10',
  text: 'Your invoice is attached.\nThank you, André',
  html: '<p>Your invoice is <b>attached</b>.</p><script>parent.alert(1)</script>',
  attachments: [
    { filename: 'Invoice 1001.pdf', content: Buffer.from('%PDF-1.7 not really'), contentType: 'application/pdf' },
  ],
};

describe('as JSON', () => {
  it('tells everything about a mail', async () => {
    await send({ ...invoice, headers: { 'X-Kind': 'invoice' } });
    const summary = await newest();
    expect(summary).toEqual({
      id: expect.any(String),
      receivedAt: ARRIVED.toISOString(),
      from: '"Seamwright" <desk@seamwright.example>',
      to: '"Kitchen" <kitchen@fold.example>',
      recipients: ['kitchen@fold.example', 'accounts@seamwright.example'],
      subject: 'Invoice 1001 – £42.10',
      attachments: [{ fileName: 'Invoice 1001.pdf', contentType: 'application/pdf', sizeBytes: 19 }],
    });
    const detail = (await get(`/api/messages/${summary.id}`)).body;
    expect(detail).toMatchObject({ ...summary, headers: { 'x-kind': 'invoice' } });
    expect(detail.text.trim()).toBe('Your invoice is attached.\nThank you, André');
    expect(detail.html).toContain('<b>attached</b>');
  });

  it('hands attachments out byte for byte, as downloads', async () => {
    await send(invoice);
    const { id } = await newest();
    const file = await get(`/api/messages/${id}/attachments/0`).buffer(true);
    expect(Buffer.from(file.body).toString()).toBe('%PDF-1.7 not really');
    expect(file.headers).toMatchObject({
      'content-type': 'application/pdf',
      'content-disposition': 'attachment; filename="Invoice 1001.pdf"',
    });
    for (const position of ['1', '-1', 'x']) {
      expect((await get(`/api/messages/${id}/attachments/${position}`)).status).toBe(404);
    }
  });

  it('finds by address, hidden copies too, and deletes all', async () => {
    await send(invoice);
    await send({ to: 'other@fold.example', subject: 'Second', text: 'x' });
    const subjects = async (to: string) =>
      (await get(`/api/messages?to=${encodeURIComponent(to)}`)).body.messages.map(
        ({ subject }: { subject: string }) => subject,
      );
    expect(await subjects('')).toEqual(['Second', 'Invoice 1001 – £42.10']);
    expect(await subjects('Accounts@Seamwright.example')).toEqual(['Invoice 1001 – £42.10']);
    expect(await subjects('fold.example')).toEqual([]);
    await request(listening.url).delete('/api/messages').expect(204);
    expect(await subjects('')).toEqual([]);
    expect((await get('/api/messages/none')).status).toBe(404);
    expect((await get('/api/messages?to=a&to=b')).status).toBe(400);
  });
});

describe('as a page', () => {
  it('says so while there is nothing', async () => {
    expect((await get('/')).text).toContain('No mail yet');
  });

  it('lists mails and shows one, its formatted part only in a frame that may do nothing', async () => {
    await send(invoice);
    const { id } = await newest();
    expect((await get('/')).text).toContain(`<a href="/messages/${id}">Invoice 1001 – £42.10</a>`);
    const { text } = await get(`/messages/${id}`);
    expect(text).toContain('Thank you, André');
    expect(text).toContain(`<iframe sandbox="" src="/messages/${id}/html"`);
    expect(text).not.toContain('parent.alert');
    const framed = await get(`/messages/${id}/html`);
    expect(framed.text).toContain('<b>attached</b>');
    expect(framed.headers['content-security-policy']).toMatch(/default-src 'none';.* sandbox$/);
  });

  it('escapes what the sender wrote', async () => {
    await send({ to: 'a@fold.example', subject: '<img src=x>', text: '</pre><script>x</script>' });
    const { id } = await newest();
    for (const page of [await get('/'), await get(`/messages/${id}`)]) {
      expect(page.text).toContain('&lt;img src=x&gt;');
      expect(page.text).not.toContain('<script>');
    }
  });

  it('deletes all at the press of a button, but not for a page of another origin', async () => {
    await send(invoice);
    await request(listening.url).post('/clear').set('Origin', 'http://elsewhere.example').expect(403);
    expect(catcher.mailbox.list()).toHaveLength(1);
    await request(listening.url).post('/clear').expect(303);
    expect(catcher.mailbox.list()).toEqual([]);
  });

  it('says when a mail is not there', async () => {
    expect((await get('/messages/none')).status).toBe(404);
    expect((await get('/messages/none/html')).status).toBe(404);
  });
});

it(`keeps the newest ${CAPACITY}`, async () => {
  const transport = createTransport({ host: '127.0.0.1', port: listening.smtpPort, secure: false, pool: true });
  for (let sent = 1; sent <= CAPACITY + 2; sent += 1) {
    await transport.sendMail({ from: 'a@fold.example', to: 'b@fold.example', subject: `Mail ${sent}`, text: 'x' });
  }
  transport.close();
  const kept = catcher.mailbox.list();
  expect([kept.length, kept[0]?.subject, kept.at(-1)?.subject]).toEqual([CAPACITY, `Mail ${CAPACITY + 2}`, 'Mail 3']);
}, 30_000);

it('takes mail with any sign-in', async () => {
  const auth = { user: 'desk', pass: 'whatever' };
  const transport = createTransport({ host: '127.0.0.1', port: listening.smtpPort, secure: false, auth });
  await transport.sendMail({ from: 'a@fold.example', to: 'b@fold.example', subject: 'Signed in', text: 'x' });
  transport.close();
  expect(catcher.mailbox.list()).toMatchObject([{ subject: 'Signed in' }]);
});

it('leaves nothing listening when one of its ports is taken', async () => {
  const second = createMailCatcher();
  await expect(second.listen({ smtpPort: 0, httpPort: listening.httpPort })).rejects.toThrow(/EADDRINUSE/);
  await expect(second.listen({ smtpPort: listening.smtpPort, httpPort: 0 })).rejects.toThrow(/EADDRINUSE/);
});

it('stops cleanly while a sender is connected', async () => {
  const other = createMailCatcher();
  const own = await other.listen({ smtpPort: 0, httpPort: 0 });
  const socket = createConnection(own.smtpPort, '127.0.0.1');
  await new Promise((greeted) => socket.once('data', greeted));
  const hungUp = new Promise((closed) => socket.once('close', closed));
  socket.on('error', () => undefined);
  await own.close();
  socket.end();
  await hungUp;
  await expect(fetch(own.url)).rejects.toThrow();
});
