// Serves a built app: right types, caching that lets an update through, every unknown page answered by the app.
import { createReadStream, statSync } from 'node:fs';
import { createServer } from 'node:http';
import { extname, join, normalize, sep } from 'node:path';

const TYPES = {
  '.html': 'text/html; charset=utf-8',
  '.js': 'text/javascript; charset=utf-8',
  '.css': 'text/css; charset=utf-8',
  '.json': 'application/json; charset=utf-8',
  '.webmanifest': 'application/manifest+json; charset=utf-8',
  '.svg': 'image/svg+xml',
  '.png': 'image/png',
  '.ico': 'image/x-icon',
  '.woff2': 'font/woff2',
  '.bin': 'application/octet-stream',
  '.txt': 'text/plain; charset=utf-8',
};

const SAFETY = {
  'X-Content-Type-Options': 'nosniff',
  'Referrer-Policy': 'no-referrer',
  'Content-Security-Policy':
    "default-src 'self'; img-src 'self' blob: data:; media-src 'self' blob:; worker-src 'self'; " +
    "style-src 'self' 'unsafe-inline'; object-src 'none'; base-uri 'self'; frame-ancestors 'none'",
};

/** Files whose name carries a hash never change; all else is asked for again, so that an update is seen at once. */
const caching = (path) => (path.startsWith('/assets/') ? 'public, max-age=31536000, immutable' : 'no-cache');

/** The file a request means: itself, or the app's page for a page address; null where there is none. */
function fileFor(folder, path) {
  const file = normalize(join(folder, path));
  const inside = file === normalize(folder) || file.startsWith(normalize(folder + sep));
  const found = inside ? statSync(file, { throwIfNoEntry: false }) : undefined;
  if (found?.isFile()) return { file, size: found.size, path };
  const isPage = extname(path) === '' || path.startsWith('/survey/'); // ids of surveys may have dots
  if (!isPage) return null; // a missing picture or script is not a page
  const page = join(folder, 'index.html');
  const size = statSync(page, { throwIfNoEntry: false })?.size;
  return size === undefined ? null : { file: page, size, path: '/index.html' };
}

function pathOf(request) {
  try {
    return decodeURIComponent(new URL(request.url, 'http://localhost').pathname);
  } catch {
    return null;
  }
}

function refuse(response, status, text) {
  response.writeHead(status, {
    ...SAFETY,
    'Content-Type': 'text/plain; charset=utf-8',
    'Cache-Control': 'no-cache',
  });
  response.end(`${text}\n`);
}

/** An HTTP server for the built app in `folder`; it does not listen yet. */
export function appServer(folder) {
  return createServer((request, response) => {
    if (request.method !== 'GET' && request.method !== 'HEAD')
      return refuse(response, 405, 'Only GET and HEAD.');
    const path = pathOf(request);
    if (path === null || path.includes('\0')) return refuse(response, 400, 'This address cannot be read.');
    const found = fileFor(folder, path);
    if (!found) return refuse(response, 404, 'Not found.');
    response.writeHead(200, {
      ...SAFETY,
      'Content-Type': TYPES[extname(found.file)] ?? 'application/octet-stream',
      'Content-Length': found.size,
      'Cache-Control': caching(found.path),
    });
    if (request.method === 'HEAD') return response.end();
    createReadStream(found.file)
      .on('error', () => response.destroy())
      .pipe(response);
  });
}

/** Listens on this machine only, on the first free port from `port` up; gives the port. */
export function listenFrom(server, port, attempts = 50) {
  return new Promise((resolve, reject) => {
    server.once('error', (error) => {
      if (error.code !== 'EADDRINUSE' || attempts <= 1) return reject(error);
      resolve(listenFrom(server, port + 1, attempts - 1));
    });
    server.listen(port, '127.0.0.1', () => {
      server.removeAllListeners('error');
      resolve(server.address().port);
    });
  });
}
