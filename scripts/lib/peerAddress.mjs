import { Server } from 'node:http';

// Loaded into the pages' server before its own program. The framework sets X-Forwarded-For to the address at the other end of
// the connection only where the request brings none, so anybody could choose the address that their tries are counted by.
// Here that address stands last in every request, as if a proxy had passed it on; FOLDSPAR_TRUSTED_PROXIES says which to skip.

Server.prototype.emit = function emit(event, ...values) {
  const [request] = values;
  const peer = event === 'request' ? request.socket.remoteAddress : undefined;
  if (peer !== undefined) {
    const claimed = request.headers['x-forwarded-for'];
    request.headers['x-forwarded-for'] = claimed ? `${claimed}, ${peer}` : peer;
  }
  return Object.getPrototypeOf(Server.prototype).emit.call(this, event, ...values);
};
