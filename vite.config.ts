import { availableParallelism } from 'node:os';
import { defineConfig } from 'vitest/config';
import type { Plugin } from 'vite';
import { VitePWA } from 'vite-plugin-pwa';

const jsx = { jsx: { runtime: 'automatic', importSource: 'preact' } } as const;

// The built page loads from its own address alone, whatever server it is put on.
const CONTENT_POLICY =
  "default-src 'self'; img-src 'self' blob: data:; worker-src 'self'; object-src 'none'; base-uri 'self'; form-action 'self'";

const contentPolicy: Plugin = {
  name: 'noonmark-content-policy',
  apply: 'build',
  transformIndexHtml: () => [
    {
      tag: 'meta',
      attrs: { 'http-equiv': 'Content-Security-Policy', content: CONTENT_POLICY },
      injectTo: 'head-prepend',
    },
  ],
};

// All cores, and at least two files at a time: browser tests wait more than they compute.
const maxWorkers = Math.max(2, availableParallelism());
// Modules are loaded once for all files of a worker, since loading them anew costs more than the tests.
const sharedWorkers = { isolate: false, maxWorkers };
// Files that put a mock in the place of a module, which all later files of the worker would get too.
const MOCKED = 'tests/**/*.mocked.test.ts';

const unitTest = {
  environment: 'node',
  testTimeout: 60_000,
  hookTimeout: 60_000,
  maxWorkers,
  unstubGlobals: true,
  sequence: { groupOrder: 0 },
} as const;

// The PDF library would load these to draw web pages and SVG; the report is painted without them.
const EMPTY_MODULE = '\0empty-module';
const withoutUnusedPackages: Plugin = {
  name: 'noonmark-without-unused-packages',
  enforce: 'pre',
  resolveId: (id) => (['html2canvas', 'dompurify', 'canvg'].includes(id) ? EMPTY_MODULE : null),
  load: (id) => (id === EMPTY_MODULE ? 'export default undefined;' : null),
};

export default defineConfig({
  oxc: jsx,
  build: { target: 'es2022', sourcemap: false },
  worker: { format: 'es' },
  plugins: [
    contentPolicy,
    withoutUnusedPackages,
    VitePWA({
      strategies: 'injectManifest',
      srcDir: 'src/service-worker',
      filename: 'service-worker.ts',
      injectRegister: false,
      includeManifestIcons: false,
      manifest: {
        name: 'Noonmark',
        short_name: 'Noonmark',
        description: 'Solar site surveys, offline: what blocks the sun and what it costs.',
        theme_color: '#fbf8f0',
        background_color: '#fbf8f0',
        display: 'standalone',
        id: '/',
        lang: 'en',
        start_url: '/',
        icons: [
          { src: '/icon.svg', sizes: 'any', type: 'image/svg+xml' },
          { src: '/icon-192.png', sizes: '192x192', type: 'image/png' },
          { src: '/icon-512.png', sizes: '512x512', type: 'image/png' },
          { src: '/icon-maskable-512.png', sizes: '512x512', type: 'image/png', purpose: 'maskable' },
        ],
      },
      injectManifest: {
        globPatterns: ['**/*.{js,css,html,svg,png,json,bin,ttf}'],
        maximumFileSizeToCacheInBytes: 3_000_000,
      },
    }),
  ],
  test: {
    projects: [
      {
        oxc: jsx,
        test: {
          name: 'unit',
          include: ['tests/**/*.test.{ts,tsx}'],
          exclude: ['tests/browser/**', MOCKED],
          ...unitTest,
          ...sharedWorkers,
        },
      },
      {
        oxc: jsx,
        test: { name: 'unit-mocked', include: [MOCKED], ...unitTest },
      },
      {
        test: {
          name: 'browser',
          include: ['tests/browser/**/*.test.ts'],
          globalSetup: ['tests/browser/build-once.ts'],
          environment: 'node',
          // a busy machine calculates for seconds
          expect: { poll: { timeout: 20_000 } },
          testTimeout: 240_000,
          hookTimeout: 180_000,
          ...sharedWorkers,
          sequence: { groupOrder: 1 },
        },
      },
    ],
  },
});
