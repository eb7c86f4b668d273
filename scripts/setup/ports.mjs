import { createServer } from 'node:net';

const LOOPBACK = '127.0.0.1';

export function isFree(port) {
  return new Promise((resolve) => {
    const probe = createServer();
    probe.once('error', () => resolve(false));
    probe.listen({ port, host: LOOPBACK, exclusive: true }, () => probe.close(() => resolve(true)));
  });
}

/** The first free port on loopback from `first` on. */
export async function findFreePort(first, tries = 200) {
  for (let port = first; port < first + tries; port += 1) {
    if (await isFree(port)) return port;
  }
  throw new Error(`No free port between ${first} and ${first + tries - 1} on ${LOOPBACK}.`);
}
