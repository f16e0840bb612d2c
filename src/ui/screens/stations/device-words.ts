/**
 * The name of a phone in a device's words, which are those of its browser where no recording named itself; null where
 * they name none, as on a desk.
 */
function phoneName(device: string): string | null {
  const parts = device.split(';').map((part) => part.trim());
  if (/^(iPhone|iPad|iPod)/.test(parts[0])) return parts[0];
  if (!device.includes(';')) return /unknown|^X11|^Windows|^Macintosh/.test(device) ? null : device;
  const android = parts.findIndex((part) => part.startsWith('Android'));
  const model = android < 0 ? '' : (parts[android + 1] ?? '').replace(/ Build\/.*$/, '');
  const isHidden = ['', 'K', 'wv', 'Mobile', 'Tablet'].includes(model);
  return isHidden ? null : model;
}

/** What a sitting was sighted with, as people call it. `userAgent`: the words of the browser at work. */
export function deviceName(device: string | undefined, userAgent: string): string {
  if (device === undefined) return 'a phone';
  return phoneName(device) ?? (userAgent.includes(`(${device})`) ? 'this device' : 'a device without a name');
}
