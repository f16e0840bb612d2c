import { afterEach, describe, expect, it, vi } from 'vitest';
import { canShareFiles, shareFile } from '../../../src/ui/device/share-file.ts';

const file = new File(['x'], 'report.pdf', { type: 'application/pdf' });
function device(answer: () => Promise<void>) {
  const share = vi.fn(answer);
  vi.stubGlobal('navigator', { canShare: () => true, share });
  return share;
}
const closed = (name: string) => () => Promise.reject(new DOMException('', name));

afterEach(() => vi.unstubAllGlobals());

describe('the share sheet', () => {
  it('is offered only where the device shares files', () => {
    vi.stubGlobal('navigator', {});
    expect(canShareFiles()).toBe(false);
    vi.stubGlobal('navigator', { canShare: () => false });
    expect(canShareFiles()).toBe(false);
    device(() => Promise.resolve());
    expect(canShareFiles()).toBe(true);
  });

  it('gets the file; closing it is no fault, and a tap too long ago asks for another (Web Share, 2.1.2)', async () => {
    const share = device(() => Promise.resolve());
    expect(await shareFile(file)).toBe('shared');
    expect(share).toHaveBeenCalledWith({ files: [file], title: 'report.pdf' });
    device(closed('AbortError'));
    expect(await shareFile(file)).toBe('left');
    device(closed('NotAllowedError'));
    expect(await shareFile(file)).toBe('tap-again');
  });

  it('passes on what else goes wrong', async () => {
    device(closed('DataError'));
    await expect(shareFile(file)).rejects.toThrow();
  });
});
