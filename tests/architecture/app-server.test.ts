import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import type { Server } from 'node:http';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { projectFolder } from './cruise.ts';

interface ServerModule {
  appServer: (folder: string) => Server;
  listenFrom: (server: Server, port: number) => Promise<number>;
}

const { appServer, listenFrom } = (await import(`${projectFolder}.ci/app-server.mjs`)) as ServerModule;

let folder: string;
let server: Server;
let address: string;
let port: number;

beforeAll(async () => {
  folder = mkdtempSync(join(tmpdir(), 'noonmark-server-'));
  mkdirSync(join(folder, 'dist', 'assets'), { recursive: true });
  writeFileSync(join(folder, 'secret.txt'), 'outside');
  writeFileSync(join(folder, 'dist', 'index.html'), '<p>app</p>');
  writeFileSync(join(folder, 'dist', 'service-worker.js'), '1;');
  writeFileSync(join(folder, 'dist', 'app.webmanifest'), '{}');
  writeFileSync(join(folder, 'dist', 'assets', 'main-1a2b.js'), '2;');
  server = appServer(join(folder, 'dist'));
  port = await listenFrom(server, 8600);
  address = `http://127.0.0.1:${port}`;
});

afterAll(() => {
  server.close();
  server.closeAllConnections();
  rmSync(folder, { recursive: true, force: true });
});

async function get(path: string) {
  const response = await fetch(address + path);
  const { headers, status } = response;
  return {
    status,
    type: headers.get('content-type'),
    cache: headers.get('cache-control'),
    text: await response.text(),
  };
}

describe('the server of npm start', () => {
  it('gives each kind of file its type and its caching', async () => {
    expect(await get('/service-worker.js')).toMatchObject({
      type: 'text/javascript; charset=utf-8',
      cache: 'no-cache',
    });
    expect(await get('/assets/main-1a2b.js')).toMatchObject({ cache: 'public, max-age=31536000, immutable' });
    expect(await get('/app.webmanifest')).toMatchObject({ type: 'application/manifest+json; charset=utf-8' });
  });

  it.each(['/', '/index.html', '/surveys/abc', '/surveys/abc?tab=1'])(
    'answers %s with the app',
    async (path) => {
      expect(await get(path)).toEqual({
        status: 200,
        type: 'text/html; charset=utf-8',
        cache: 'no-cache',
        text: '<p>app</p>',
      });
    },
  );

  it('answers a missing file with 404', async () => {
    expect((await get('/assets/gone-9z.js')).status).toBe(404);
  });

  it('gives nothing from outside its folder', async () => {
    for (const path of ['/%2e%2e/secret.txt', '/..%2fsecret.txt', '/assets/..%2f..%2fsecret.txt'])
      expect((await get(path)).text).not.toContain('outside');
  });

  it('answers an address that cannot be read with 400', async () => {
    expect((await get('/%ff')).status).toBe(400);
  });

  it('takes the next port where one is taken', async () => {
    const second = appServer(join(folder, 'dist'));
    expect(await listenFrom(second, port)).toBeGreaterThan(port);
    second.close();
  });
});
