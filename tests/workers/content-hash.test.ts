import { expect, it } from 'vitest';
import { contentHash } from '../../src/workers/content-hash.ts';

// the authors' test vectors for 32-bit FNV-1a (Fowler, Noll, Vo; from memory)
it.each([
  ['', 0x811c9dc5],
  ['a', 0xe40c292c],
  ['foobar', 0xbf9cf968],
])('contentHash of %o', (text, hash) => {
  expect(contentHash(new TextEncoder().encode(text))).toBe(hash);
});
