import { createHash } from 'node:crypto';
import { beforeEach, describe, expect, it, vi } from 'vitest';
import { emptyBrowser, tab } from './memory-database.ts';

beforeEach(emptyBrowser);

const bytesOf = (text: string): ArrayBuffer => new TextEncoder().encode(text).buffer;

describe('kept weather files', () => {
  it('come back byte for byte under the hash of their contents', async () => {
    const { weather } = tab();
    const kept = await weather.keep('invented.epw', bytesOf('LOCATION,Nowhere'));
    // Against Node's own SHA-256 (FIPS 180-4).
    expect(kept.sha256).toBe(createHash('sha256').update('LOCATION,Nowhere').digest('hex'));
    expect(new TextDecoder().decode((await weather.bytes(kept.sha256))!)).toBe('LOCATION,Nowhere');
    expect(await weather.list()).toEqual([kept]);
  });

  it('are kept once however often they are picked', async () => {
    const { weather } = tab();
    await weather.keep('a.epw', bytesOf('same'));
    await weather.keep('copy of a.epw', bytesOf('same'));
    expect((await weather.list()).map(({ name }) => name)).toEqual(['copy of a.epw']);
  });

  it('can be forgotten', async () => {
    const { weather } = tab();
    const { sha256 } = await weather.keep('a.epw', bytesOf('a'));
    await weather.forget(sha256);
    expect(await weather.list()).toEqual([]);
    expect(await weather.bytes(sha256)).toBeNull();
  });

  it('that find no room leave nothing behind', async () => {
    const { weather } = tab();
    const kept = await weather.keep('fits.epw', bytesOf('fits'));
    const put = vi.spyOn(IDBObjectStore.prototype, 'put').mockImplementation(() => {
      throw new DOMException('no room', 'QuotaExceededError');
    });
    await expect(weather.keep('large.epw', bytesOf('large'))).rejects.toMatchObject({ code: 'storage-full' });
    put.mockRestore();
    expect(await weather.list()).toEqual([kept]);
  });
});
