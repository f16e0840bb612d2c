import { fc, test } from '@fast-check/vitest';
import { expect } from 'vitest';
import { LeastFirst } from '../../../src/core/pointing/least-first.ts';

test.prop([fc.array(fc.integer({ min: -50, max: 50 }))])(
  'what is put in comes out, the least first',
  (keys) => {
    const queue = new LeastFirst<string>();
    keys.forEach((key) => queue.push(key, `item ${key}`));
    const out = keys.map(() => queue.pop());
    expect(out.map((one) => one?.key)).toEqual([...keys].sort((a, b) => a - b));
    expect(out.every((one) => one?.item === `item ${one?.key}`)).toBe(true);
    expect(queue.pop()).toBe(null);
  },
);
