import { randomUUID } from 'node:crypto';
import type { AddressInfo } from 'node:net';
import { buffer } from 'node:stream/consumers';
import { simpleParser } from 'mailparser';
import { SMTPServer } from 'smtp-server';
import type { Mailbox } from './mailbox';
import { toMessage } from './message';

/** The largest mail taken, in bytes. */
export const LARGEST_MAIL = 25 * 1024 * 1024;

/** How long senders that are still connected may keep a stop waiting. */
const STOP_WITHIN_MS = 500;

/** A listening SMTP server. */
export interface SmtpListener {
  port: number;
  close(): Promise<void>;
}

function makeServer(mailbox: Mailbox, now: () => Date): SMTPServer {
  return new SMTPServer({
    // Any name and password will do, and none: what is sent here goes nowhere.
    authOptional: true,
    allowInsecureAuth: true,
    disabledCommands: ['STARTTLS'],
    disableReverseLookup: true,
    size: LARGEST_MAIL,
    closeTimeout: STOP_WITHIN_MS,
    onAuth: (auth, _session, done) => done(null, { user: auth.username ?? 'anyone' }),
    onData: (stream, session, done) => {
      buffer(stream)
        .then(async (source) => {
          if (stream.sizeExceeded) {
            done(Object.assign(new Error('The mail is too large.'), { responseCode: 552 }));
            return;
          }
          const recipients = session.envelope.rcptTo.map(({ address }) => address);
          const mail = await simpleParser(source);
          mailbox.add(toMessage(mail, { id: randomUUID(), at: now(), recipients }));
          done();
        })
        .catch((error: unknown) => done(error instanceof Error ? error : new Error(String(error))));
    },
  });
}

/** Takes mail on 127.0.0.1; port 0 takes a free one. Rejects when the port is taken. */
export function listenForMail(mailbox: Mailbox, port: number, now: () => Date): Promise<SmtpListener> {
  const server = makeServer(mailbox, now);
  return new Promise((resolve, reject) => {
    server.once('error', reject);
    const listening = server.listen(port, '127.0.0.1', () => {
      server.off('error', reject);
      // A sender that hangs up in the middle is its own affair.
      server.on('error', (error) => console.error(`SMTP: ${error.message}`));
      resolve({
        port: (listening.address() as AddressInfo).port,
        close: () => new Promise((closed) => server.close(() => closed())),
      });
    });
  });
}
