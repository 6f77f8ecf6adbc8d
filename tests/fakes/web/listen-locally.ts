import type { Server } from 'node:http';
import type { AddressInfo } from 'node:net';

/** Listens on 127.0.0.1 only: a fake must never be reachable from another machine. Port 0 takes a free one. */
export function listenLocally(server: Server, port: number): Promise<number> {
  return new Promise((resolve, reject) => {
    server.once('error', (error: NodeJS.ErrnoException) =>
      reject(
        error.code === 'EADDRINUSE'
          ? new Error(`port ${port} is in use: stop what listens there, or choose another`)
          : error,
      ),
    );
    server.listen(port, '127.0.0.1', () => resolve((server.address() as AddressInfo).port));
  });
}

export function closeServer(server: Server): Promise<void> {
  return new Promise((resolve) => {
    server.close(() => resolve());
    server.closeAllConnections();
  });
}
