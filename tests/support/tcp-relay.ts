import { connect, createServer, type AddressInfo, type Server, type Socket } from 'node:net';

export interface TcpRelay {
  /** the same URL, through the relay */
  url: (url: string) => string;
  /** cuts every connection and takes no new one, as if the other end were gone */
  cut: () => Promise<void>;
  /** takes connections again, on the same port */
  restore: () => Promise<void>;
}

/** A relay on loopback in front of PostgreSQL, so that a test can take it away for itself alone. */
export async function openTcpRelay(target: string): Promise<TcpRelay> {
  const { hostname, port } = new URL(target);
  const sockets = new Set<Socket>();
  const keep = (socket: Socket) => {
    sockets.add(socket);
    socket.on('error', () => socket.destroy());
    socket.on('close', () => sockets.delete(socket));
  };
  const relay = (near: Socket) => {
    const far = connect(Number(port || 5432), hostname);
    [near, far].forEach(keep);
    near.pipe(far).pipe(near);
    near.on('close', () => far.destroy());
    far.on('close', () => near.destroy());
  };
  const listen = (at: number) =>
    new Promise<Server>((resolve, reject) => {
      const server = createServer(relay).once('error', reject);
      server.listen(at, '127.0.0.1', () => resolve(server));
    });
  let server = await listen(0);
  const at = (server.address() as AddressInfo).port;
  return {
    url: (url) => Object.assign(new URL(url), { hostname: '127.0.0.1', port: String(at) }).href,
    cut: async () => {
      const closed = new Promise((resolve) => server.close(resolve));
      sockets.forEach((socket) => socket.destroy());
      await closed;
    },
    restore: async () => {
      server = await listen(at);
    },
  };
}
