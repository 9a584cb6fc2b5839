import { pino, type Logger } from 'pino';

export type Log = Logger;

/** Structured logs, one JSON object a line; secrets never get in. */
export function createLog(level: string, name: string): Log {
  return pino({
    name,
    level,
    redact: {
      paths: [
        'req.headers.authorization',
        'req.headers.cookie',
        'req.headers["stripe-signature"]',
        'res.headers["set-cookie"]',
        '*.password',
        '*.token',
        '*.secret',
      ],
      censor: '[hidden]',
    },
  });
}
