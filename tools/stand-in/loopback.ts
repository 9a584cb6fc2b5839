import type { RequestHandler } from 'express';

const loopbackAddress = /^(127\.\d+\.\d+\.\d+|::1|::ffff:127\.\d+\.\d+\.\d+)$/;
const loopbackHost = /^(127\.0\.0\.1|localhost|\[::1\])(:\d+)?$/;

/**
 * Lets only this machine in: the caller's address and the name it used must be loopback (a foreign name pointed at
 * 127.0.0.1 is refused), and a page of another origin may not press the buttons of this one.
 */
export function loopbackOnly(): RequestHandler {
  return (request, response, next) => {
    const host = request.headers.host ?? '';
    const origin = request.headers.origin;
    const foreignOrigin = origin !== undefined && origin !== `http://${host}`;
    if (!loopbackAddress.test(request.socket.remoteAddress ?? '') || !loopbackHost.test(host) || foreignOrigin) {
      response.status(403).json({ error: { message: 'Only this machine may use this address.' } });
      return;
    }
    next();
  };
}
