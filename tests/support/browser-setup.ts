import { createServer, type Server } from 'node:net';
import { setTimeout as sleep } from 'node:timers/promises';

const TEST_MS = 120_000;
const TURN_MS = 20 * 60_000;
// The workers' servers listen on the ports after this one (server-process.ts).
const TURN_PORT = Number(process.env.E2E_PORT ?? 3470);

let turn: Server | null = null;

/** Who listens has the turn; the system frees the port when a worker dies. */
function listen(): Promise<Server | null> {
  return new Promise((resolve) => {
    const server = createServer();
    server.once('error', () => resolve(null));
    server.listen({ port: TURN_PORT, host: '127.0.0.1', exclusive: true }, () => resolve(server));
  });
}

jest.setTimeout(TEST_MS);

// One browser at a time: two would starve each other on two cores. Other tests run beside it.
beforeAll(async () => {
  for (turn = await listen(); turn === null; turn = await listen()) await sleep(200);
}, TURN_MS);

afterAll(() => {
  turn?.close();
});
