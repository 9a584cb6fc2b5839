// Loopback ports: which are free, and who answers on them.
import { get } from 'node:http';
import { connect, createServer } from 'node:net';
import { setTimeout as pause } from 'node:timers/promises';

/**
 * True when nobody listens on a port of 127.0.0.1.
 * @param {number} port
 * @returns {Promise<boolean>}
 */
export const isFree = (port) =>
  listen(port).then(
    () => true,
    () => false,
  );

/**
 * A free port: the preferred one when it is free, else any that the system gives.
 * @param {number} [preferred]
 * @returns {Promise<number>}
 */
export const freePort = async (preferred) => (preferred && (await isFree(preferred)) ? preferred : listen(0));

/** Listens for a moment and tells the port. */
function listen(port) {
  return new Promise((done, fail) => {
    const server = createServer();
    server.once('error', fail);
    server.listen({ port, host: '127.0.0.1', exclusive: true }, () => {
      const bound = server.address().port;
      server.close(() => done(bound));
    });
  });
}

/**
 * Waits until something holds, asking again and again.
 * @param {() => Promise<boolean> | boolean} holds
 * @param {number} patienceMs
 * @returns {Promise<boolean>} false when the patience ran out
 */
export async function until(holds, patienceMs) {
  const end = Date.now() + patienceMs;
  while (!(await holds())) {
    if (Date.now() > end) return false;
    await pause(100);
  }
  return true;
}

/**
 * True when somebody accepts connections on a port of 127.0.0.1.
 * @param {number} port
 * @returns {Promise<boolean>}
 */
export function accepts(port) {
  return new Promise((done) => {
    const socket = connect({ port, host: '127.0.0.1' });
    const answer = (accepted) => {
      socket.destroy();
      done(accepted);
    };
    socket.once('connect', () => answer(true)).once('error', () => answer(false));
  });
}

/**
 * True when an address answers 200.
 * @param {string} url
 * @returns {Promise<boolean>}
 */
export function answersOk(url) {
  return new Promise((done) => {
    const request = get(url, { agent: false, timeout: 2_000 }, (response) => {
      response.resume();
      done(response.statusCode === 200);
    });
    request.once('timeout', () => request.destroy()).once('error', () => done(false));
  });
}
