/** Whether bytes begin as a picture of this type does and tell its size; the library paints others as nothing. */
export function isReadable(bytes: Uint8Array, type: 'PNG' | 'JPEG'): boolean {
  return type === 'PNG' ? isPng(bytes) : isJpeg(bytes);
}

const PNG_HEAD = [0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a];

const isPng = (bytes: Uint8Array) => bytes.length > 33 && PNG_HEAD.every((byte, i) => bytes[i] === byte);

/** Walks the segments to the frame's header. Ref: ITU-T T.81, annex B. */
function isJpeg(bytes: Uint8Array): boolean {
  const word = (at: number) => bytes[at] * 256 + bytes[at + 1];
  if (word(0) !== 0xffd8) return false;
  for (let at = 2; at + 9 < bytes.length && bytes[at] === 0xff;) {
    const marker = bytes[at + 1];
    const isFrame = marker >= 0xc0 && marker <= 0xcf && ![0xc4, 0xc8, 0xcc].includes(marker);
    if (isFrame) return word(at + 5) > 0 && word(at + 7) > 0;
    // fill bytes before a marker
    at += marker === 0xff ? 1 : 2 + word(at + 2);
  }
  return false;
}
