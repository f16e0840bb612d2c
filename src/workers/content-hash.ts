/**
 * A 32-bit hash of bytes, which tells two contents apart but for a chance of 1 in 4 thousand million; not against ill will.
 * Ref: Fowler, Noll, Vo, The FNV Non-Cryptographic Hash Algorithm (IETF draft-eastlake-fnv), FNV-1a of 32 bits.
 */
export function contentHash(bytes: Uint8Array): number {
  let hash = 0x811c9dc5;
  for (let i = 0; i < bytes.length; i++) hash = Math.imul(hash ^ bytes[i], 0x01000193);
  return hash >>> 0;
}
