import { readFileSync, readdirSync } from 'node:fs';
import { join } from 'node:path';
import { gzipSync } from 'node:zlib';

/** Gzipped bytes of what a browser must fetch of a built app, kB of 1,000 bytes. */
export function builtSizes(folder: string): { firstScreen: number; precache: number } {
  const kilobytes = (files: string[]) =>
    files.reduce((sum, file) => sum + gzipSync(readFileSync(join(folder, file)), { level: 9 }).length, 0) /
    1000;
  return { firstScreen: kilobytes(firstScripts(folder)), precache: kilobytes(precached(folder)) };
}

/** Scripts that index.html names and what they import at once, dynamic imports left out. */
function firstScripts(folder: string): string[] {
  const html = readFileSync(join(folder, 'index.html'), 'utf8');
  const waiting = [...html.matchAll(/(?:src|href)="\/(assets\/[^"]+\.js)"/g)].map(([, file]) => file);
  const found = new Set<string>();
  while (waiting.length > 0) {
    const file = waiting.pop()!;
    if (found.has(file)) continue;
    found.add(file);
    const code = readFileSync(join(folder, file), 'utf8');
    for (const [, name] of code.matchAll(
      /(?:^|[;}\s])(?:import|export)[^"'()]*?from\s*["']\.\/([^"']+)["']/g,
    ))
      waiting.push(`assets/${name}`);
    for (const [, name] of code.matchAll(/(?:^|[;}\s])import\s*["']\.\/([^"']+)["']/g))
      waiting.push(`assets/${name}`);
  }
  return [...found];
}

function precached(folder: string): string[] {
  return readdirSync(folder, { recursive: true, withFileTypes: true })
    .filter((entry) => entry.isFile())
    .map((entry) => join(entry.parentPath, entry.name).slice(folder.length + 1));
}
