// The web process: Next.js behind a plain HTTP server, so that the caller's network address is known for sure.
// Next trusts X-Forwarded-For as a client sends it; here it counts only for proxies that the operator has named.
import { createServer } from 'node:http';
import next from 'next';
import { readNetwork } from './network-address.mjs';

const port = Number(process.env.PORT ?? 3000);
const hostname = process.env.HOST ?? '127.0.0.1';
const trustedProxies = Number(process.env.RAGLAN_TRUSTED_PROXIES ?? 0);
const dev = process.argv.includes('--dev');

const app = next({ dev, hostname, port, dir: process.cwd() });
const handle = app.getRequestHandler();
await app.prepare();
const upgrade = app.getUpgradeHandler();

/**
 * The address nearest to the outermost proxy we trust; without proxies, the socket's own.
 * @param {import('node:http').IncomingMessage} request
 */
function findAddress(request) {
  const socket = request.socket.remoteAddress ?? 'unknown';
  if (trustedProxies === 0) return socket;
  const hops = String(request.headers['x-forwarded-for'] ?? '')
    .split(',')
    .map((hop) => hop.trim())
    .filter(Boolean);
  return hops.at(-trustedProxies) ?? socket;
}

/**
 * Next drops the Content-Length of every answer it did not write itself. A download says its size in `x-body-bytes`,
 * which becomes the real header here, so that browsers can show how far they are.
 * @param {import('node:http').ServerResponse} response
 */
function letDownloadsSayTheirSize(response) {
  const set = response.setHeader.bind(response);
  response.setHeader = (name, value) =>
    name.toLowerCase() === 'x-body-bytes' ? set('content-length', String(value)) : set(name, value);
}

const server = createServer((request, response) => {
  letDownloadsSayTheirSize(response);
  request.headers['x-raglan-address'] = readNetwork(findAddress(request));
  delete request.headers['x-request-id'];
  handle(request, response);
});
server.on('upgrade', (request, socket, head) => upgrade(request, socket, head));
server.on('error', (error) => {
  const says =
    /** @type {NodeJS.ErrnoException} */ (error).code === 'EADDRINUSE'
      ? `Port ${port} is taken. Stop what uses it, or start with PORT=${port + 1}.`
      : error.message;
  console.error(says);
  process.exit(1);
});
server.listen(port, hostname, () => console.log(`web listening on http://${hostname}:${port}`));

for (const signal of ['SIGINT', 'SIGTERM']) {
  process.once(signal, () => {
    // Requests under way are answered; a client that keeps its connection open does not hold us for ever.
    server.close(() => process.exit(0));
    server.closeIdleConnections();
    setTimeout(() => process.exit(0), 5_000).unref();
  });
}
