import { createServer } from 'node:net';

const LOOPBACK = '127.0.0.1';
const TRIES = 400;

export function isFree(port) {
  return new Promise((resolve) => {
    const probe = createServer();
    probe.once('error', () => resolve(false));
    probe.listen({ port, host: LOOPBACK, exclusive: true }, () => probe.close(() => resolve(true)));
  });
}

/** The first port on loopback from `first` on that is free, with the `count - 1` after it. */
export async function findFreePort(first, count = 1) {
  for (let port = first; port < first + TRIES; port += count) {
    const row = Array.from({ length: count }, (_, index) => isFree(port + index));
    if ((await Promise.all(row)).every(Boolean)) return port;
  }
  throw new Error(`No free port from ${first} to ${first + TRIES} on ${LOOPBACK}.`);
}
