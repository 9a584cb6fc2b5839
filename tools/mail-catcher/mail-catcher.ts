import express, { type Express } from 'express';
import { loopbackOnly } from '../stand-in/loopback';
import { listenOnLoopback } from '../stand-in/loopback-server';
import { apiRouter } from './api';
import { Mailbox } from './mailbox';
import { pageRouter } from './page';
import { listenForMail } from './smtp';

/** A mail catcher that listens: where mail goes in, and where it is seen. */
export interface ListeningMailCatcher {
  smtpPort: number;
  httpPort: number;
  url: string;
  close(): Promise<void>;
}

/** A mail catcher: its mails, its page and JSON, and how to start it. */
export interface MailCatcher {
  app: Express;
  mailbox: Mailbox;
  /** Listens on loopback only; port 0 takes a free one. Rejects when one is taken, with nothing left listening. */
  listen(ports: { smtpPort: number; httpPort: number }): Promise<ListeningMailCatcher>;
}

/** An SMTP server that keeps what it is given in memory and sends nothing on. `now` dates what arrives. */
export function createMailCatcher({ now = () => new Date() }: { now?: () => Date } = {}): MailCatcher {
  const mailbox = new Mailbox();
  const app = express();
  app.disable('x-powered-by');
  app.use(loopbackOnly());
  app.use('/api', apiRouter(mailbox));
  app.use(pageRouter(mailbox));
  return {
    app,
    mailbox,
    listen: async ({ smtpPort, httpPort }) => {
      const smtp = await listenForMail(mailbox, smtpPort, now);
      try {
        const http = await listenOnLoopback(app, httpPort);
        return {
          smtpPort: smtp.port,
          httpPort: http.port,
          url: http.url,
          close: async () => {
            await Promise.all([smtp.close(), http.close()]);
          },
        };
      } catch (error) {
        await smtp.close();
        throw error;
      }
    },
  };
}
