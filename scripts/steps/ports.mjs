import { createServer } from 'node:net';

const canListen = (port) =>
  new Promise((resolve) => {
    const server = createServer();
    server.once('error', () => resolve(null));
    server.listen({ port, host: '127.0.0.1' }, () => {
      const found = server.address().port;
      server.close(() => resolve(found));
    });
  });

/** The first of the wished-for ports that is free on loopback, else any. */
export async function freePort(...wished) {
  for (const port of wished) if (port && (await canListen(port))) return port;
  return canListen(0);
}
