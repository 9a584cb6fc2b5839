import { Router, type Response } from 'express';
import { html } from '../stand-in/html';
import { sendPage, table } from '../stand-in/page-shell';
import { CAPACITY, type Mailbox } from './mailbox';
import type { Message } from './message';

function when(date: Date) {
  const iso = date.toISOString();
  return html`<time datetime="${iso}">${iso.slice(0, 19).replace('T', ' ')}</time>`;
}

function sendList(response: Response, mailbox: Mailbox, to: string | undefined): void {
  const messages = mailbox.list(to);
  const content = html`<header>
      <h1>Caught mail</h1>
      <p class="quiet">Nothing sent here leaves this machine. The newest ${CAPACITY} mails are kept.</p>
    </header>
    <main id="content">
      <form class="acts" role="search">
        <label for="to">Sent to</label>
        <input id="to" name="to" type="search" value="${to ?? ''}" autocomplete="off" />
        <button class="plain">Show</button>
        <a href="/">Show all</a>
      </form>
      <form method="post" action="/clear" class="acts"><button class="plain">Delete all mail</button></form>
      ${table<Message>(
        `${messages.length} ${messages.length === 1 ? 'mail' : 'mails'}, newest first`,
        [
          { head: 'Received (UTC)', cell: ({ receivedAt }) => when(receivedAt) },
          { head: 'To', cell: ({ recipients }) => recipients.join(', ') },
          {
            head: 'Subject',
            cell: ({ id, subject }) => html`<a href="/messages/${id}">${subject || '(no subject)'}</a>`,
          },
          { head: 'Files', cell: ({ attachments }) => attachments.length, number: true },
        ],
        messages,
        to ? 'No mail to this address yet.' : 'No mail yet. What the product sends appears here.',
      )}
    </main>`;
  sendPage(response, 'Caught mail', content);
}

function sendMessage(response: Response, message: Message): void {
  const { id, attachments } = message;
  const content = html`<header>
      <p><a href="/">All mail</a></p>
      <h1>${message.subject || '(no subject)'}</h1>
    </header>
    <main id="content">
      <dl class="rows">
        <dt>Received (UTC)</dt>
        <dd>${when(message.receivedAt)}</dd>
        <dt>From</dt>
        <dd>${message.from}</dd>
        <dt>To</dt>
        <dd>${message.to}</dd>
        <dt>Delivered to</dt>
        <dd>${message.recipients.join(', ')}</dd>
      </dl>
      ${
        attachments.length > 0 &&
        html`<h2>Files</h2>
          <ul>
            ${attachments.map(
              ({ fileName, contentType, content: { length } }, position) =>
                html`<li>
                  <a href="/api/messages/${id}/attachments/${position}">${fileName}</a>
                  <span class="quiet">${contentType}, ${length} bytes</span>
                </li>`,
            )}
          </ul>`
      }
      <h2>Text</h2>
      ${message.text ? html`<pre>${message.text}</pre>` : html`<p class="quiet">This mail has no text part.</p>`}
      ${
        message.html !== null &&
        html`<h2>Formatted</h2>
          <iframe sandbox="" src="/messages/${id}/html" title="The mail as it looks formatted"></iframe>`
      }
    </main>`;
  sendPage(response, message.subject || 'Mail', content);
}

function sendNotFound(response: Response): void {
  const content = html`<main id="content">
    <h1>No such mail</h1>
    <p>It may have been deleted. <a href="/">See all mail</a></p>
  </main>`;
  sendPage(response, 'No such mail', content, 404);
}

/** The pages for people: the list, one mail, and its formatted part inside a frame that may do nothing. */
export function pageRouter(mailbox: Mailbox): Router {
  const router = Router();
  router.get('/', (request, response) => {
    const { to } = request.query;
    sendList(response, mailbox, typeof to === 'string' ? to : undefined);
  });
  router.post('/clear', (_request, response) => {
    mailbox.clear();
    response.redirect(303, '/');
  });
  router.get('/messages/:id', (request, response) => {
    const message = mailbox.find(request.params.id);
    return message ? sendMessage(response, message) : sendNotFound(response);
  });
  router.get('/messages/:id/html', (request, response) => {
    const message = mailbox.find(request.params.id);
    if (!message || message.html === null) return sendNotFound(response);
    response
      .set('Cache-Control', 'no-store')
      .set('X-Content-Type-Options', 'nosniff')
      // No scripts, no forms, nothing fetched: only styles written in the mail and pictures inside it.
      .set('Content-Security-Policy', "default-src 'none'; style-src 'unsafe-inline'; img-src data:; sandbox")
      .type('html')
      .send(message.html);
  });
  return router;
}
