import { Server } from 'node:http';

/*
 * Loaded before the web server. Handlers see requests without their socket; this notes the socket's address in a header of our
 * own. Whatever a client sent under that name is overwritten, so it cannot be forged.
 */
const HEADER = 'x-ruckle-client';
// Tells lib/request/client-address.ts that the header is ours: a server started without this file believes nobody's.
globalThis[Symbol.for('ruckle.client-address')] = true;

const emit = Server.prototype.emit;

Server.prototype.emit = function (event, ...args) {
  if (event === 'request') {
    const [request] = args;
    request.headers[HEADER] = request.socket.remoteAddress ?? '';
  }
  return emit.call(this, event, ...args);
};
