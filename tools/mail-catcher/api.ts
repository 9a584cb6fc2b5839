import { Router, type Response } from 'express';
import * as z from 'zod';
import type { Mailbox } from './mailbox';
import type { MailAttachment } from './message';
import { toDetail, toSummary } from './message-json';

const listQuery = z.object({ to: z.string().optional() });
const position = z.coerce.number().int().min(0);

/** Sends an attachment as a download, never to be shown in the page's own origin. */
export function sendAttachment(response: Response, { fileName, contentType, content }: MailAttachment): void {
  response.attachment(fileName).set('X-Content-Type-Options', 'nosniff').type(contentType).send(content);
}

/** Caught mails as JSON. */
export function apiRouter(mailbox: Mailbox): Router {
  const router = Router();
  const notFound = (response: Response) => response.status(404).json({ error: 'There is no such mail here.' });
  router.get('/messages', (request, response) => {
    const query = listQuery.safeParse(request.query);
    if (!query.success) return response.status(400).json({ error: 'Give one address as `to`.' });
    return response.json({ messages: mailbox.list(query.data.to).map(toSummary) });
  });
  router.get('/messages/:id', (request, response) => {
    const message = mailbox.find(request.params.id);
    return message ? response.json(toDetail(message)) : notFound(response);
  });
  router.get('/messages/:id/attachments/:position', (request, response) => {
    const wanted = position.safeParse(request.params.position);
    const attachment = mailbox.find(request.params.id)?.attachments[wanted.success ? wanted.data : -1];
    return attachment ? sendAttachment(response, attachment) : notFound(response);
  });
  router.delete('/messages', (_request, response) => {
    mailbox.clear();
    response.status(204).end();
  });
  return router;
}
