import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { expect, it } from 'vitest';
import { projectFolder } from './cruise.ts';

it('modules are mocked only in files that share theirs with no other file', () => {
  const folder = join(projectFolder, 'tests');
  const files = readdirSync(folder, { recursive: true, encoding: 'utf8' }).filter((file) =>
    /\.test\.tsx?$/.test(file),
  );
  const mocking = files.filter((file) =>
    /\bvi\.(mock|doMock)\(/.test(readFileSync(join(folder, file), 'utf8')),
  );
  expect(mocking.length).toBeGreaterThan(0);
  expect(mocking.filter((file) => !file.endsWith('.mocked.test.ts'))).toEqual([]);
});
