import { existsSync } from 'node:fs';
import type { Server } from 'node:http';
import type { AddressInfo } from 'node:net';

import { createApp } from './app';
import type { Config } from './config';
import { connect, connectWhenBack } from './db/connect';
import { createDataSource } from './db/data-source';

const RETRY_EVERY_MS = 2000;
/** how long requests under way may take to end when the server stops */
const GRACE_MS = 5000;

export interface RunningServer {
  url: string;
  /** false: PostgreSQL is away, and is tried again until it is back */
  connected: boolean;
  stop: () => Promise<void>;
}

/**
 * Migrates, connects and listens on 127.0.0.1. Without PostgreSQL it serves the app and its plans
 * all the same.
 *
 * @throws when the port is taken, the web build is missing, or a migration fails
 */
export async function startServer(config: Config): Promise<RunningServer> {
  if (!existsSync(config.webDist)) throw new Error(`there is no web build at ${config.webDist}`);
  const db = createDataSource(config.databaseUrl);
  const { ok: connected } = await connect(db, config);
  const server = await listen(createApp({ ...config, db }), config.port);
  const waiting = new AbortController();
  // a migration that fails then is caught by nobody and ends the process, as at the start
  const background = connected
    ? Promise.resolve()
    : connectWhenBack(db, config, { everyMs: RETRY_EVERY_MS, signal: waiting.signal });
  const stop = async () => {
    waiting.abort();
    await close(server);
    await background.catch(() => undefined);
    if (db.isInitialized) await db.destroy();
  };
  return { url: `http://127.0.0.1:${(server.address() as AddressInfo).port}`, connected, stop };
}

function listen(app: ReturnType<typeof createApp>, port: number): Promise<Server> {
  return new Promise((resolve, reject) => {
    const server = app.listen(port, '127.0.0.1', (error?: Error) => {
      if (error)
        reject(error); // Express 5 hands listen errors to the callback
      else resolve(server);
    });
  });
}

async function close(server: Server): Promise<void> {
  const cut = setTimeout(() => server.closeAllConnections(), GRACE_MS);
  // close() ends the connections that are idle now, not those that become so with their answer
  const sweep = setInterval(() => server.closeIdleConnections(), 50);
  await new Promise((resolve) => server.close(resolve));
  clearInterval(sweep);
  clearTimeout(cut);
}
