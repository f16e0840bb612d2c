import { createReadStream, statSync } from 'node:fs';
import { createServer, type Server } from 'node:http';
import type { AddressInfo, Socket } from 'node:net';
import { extname, join, normalize } from 'node:path';

const TYPES: Record<string, string> = {
  '.html': 'text/html; charset=utf-8',
  '.js': 'text/javascript; charset=utf-8',
  '.css': 'text/css; charset=utf-8',
  '.json': 'application/json',
  '.webmanifest': 'application/manifest+json',
  '.svg': 'image/svg+xml',
  '.png': 'image/png',
};

/** A plain server of a folder that can be killed in the middle of anything, and started again at the same address. */
export class FileServer {
  folder: string;
  readonly #sockets = new Set<Socket>();
  #server: Server | null = null;
  #port = 0;

  constructor(folder: string) {
    this.folder = folder;
  }

  get address(): string {
    return `http://localhost:${this.#port}`;
  }

  async start(): Promise<void> {
    const server = createServer((request, response) => {
      const path = new URL(request.url ?? '/', 'http://localhost').pathname;
      const wanted = join(this.folder, normalize(decodeURIComponent(path)));
      const isFile = statSync(wanted, { throwIfNoEntry: false })?.isFile();
      const file = isFile ? wanted : join(this.folder, 'index.html');
      if (!isFile && extname(path) !== '') return response.writeHead(404).end();
      const type = TYPES[extname(file)] ?? 'application/octet-stream';
      response.writeHead(200, { 'Content-Type': type, 'Cache-Control': 'no-cache' });
      createReadStream(file).pipe(response);
    });
    server.on('connection', (socket) => {
      this.#sockets.add(socket);
      socket.on('close', () => this.#sockets.delete(socket));
    });
    await new Promise<void>((resolve) => server.listen(this.#port, '127.0.0.1', resolve));
    this.#port = (server.address() as AddressInfo).port;
    this.#server = server;
  }

  async kill(): Promise<void> {
    const server = this.#server;
    this.#server = null;
    if (!server) return;
    const closed = new Promise((resolve) => server.close(resolve));
    this.#sockets.forEach((socket) => socket.destroy());
    await closed;
  }
}
