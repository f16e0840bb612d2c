const DIGITS = 'ABCDEFGHIJKLMNOPQRSTUVWXYZabcdefghijklmnopqrstuvwxyz0123456789+/';
/** Bytes written at a time; a multiple of three, so that padding comes only at the end. */
const PIECE = 12_288;

/** Bytes as base64 (RFC 4648, section 4), as a data address needs them. */
export function base64(bytes: Uint8Array): string {
  const pieces: string[] = [];
  for (let start = 0; start < bytes.length; start += PIECE) {
    let piece = '';
    const end = Math.min(bytes.length, start + PIECE);
    for (let i = start; i < end; i += 3) {
      const three = (bytes[i] << 16) | ((bytes[i + 1] ?? 0) << 8) | (bytes[i + 2] ?? 0);
      piece +=
        DIGITS[three >> 18] +
        DIGITS[(three >> 12) & 63] +
        (i + 1 < end ? DIGITS[(three >> 6) & 63] : '=') +
        (i + 2 < end ? DIGITS[three & 63] : '=');
    }
    pieces.push(piece);
  }
  return pieces.join('');
}
