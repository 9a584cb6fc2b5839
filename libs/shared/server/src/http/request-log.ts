import { randomUUID } from 'node:crypto';
import { pinoHttp } from 'pino-http';
import type { RequestHandler } from 'express';
import type { Log } from '../log';

const REQUEST_ID = /^[\w-]{8,64}$/;

/** Gives each request an id (the caller's own when it is a sane one), sends it back, and logs the request once done. */
export function requestLog(log: Log): RequestHandler {
  return pinoHttp({
    logger: log,
    genReqId(request, response) {
      const sent = request.headers['x-request-id'];
      const id = typeof sent === 'string' && REQUEST_ID.test(sent) ? sent : randomUUID();
      response.setHeader('x-request-id', id);
      return id;
    },
    customLogLevel: (_request, response, error) => (error || response.statusCode >= 500 ? 'error' : 'debug'),
    serializers: {
      req: (request: { id: string; method: string; url: string }) => ({
        id: request.id,
        method: request.method,
        // Without the query: what people search for stays out of the logs.
        path: request.url.split('?')[0],
      }),
      res: (response: { statusCode: number }) => ({ status: response.statusCode }),
    },
  }) as unknown as RequestHandler;
}
