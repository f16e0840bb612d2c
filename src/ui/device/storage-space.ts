export interface StorageSpace {
  /** Bytes. */
  used: number;
  /** Bytes the browser would give at most; null where it does not say. */
  most: number | null;
  /** Whether the browser has promised not to clear it away by itself. */
  kept: boolean;
}

/** How much room the surveys take; null where the browser does not say. */
export async function storageSpace(): Promise<StorageSpace | null> {
  try {
    const { usage, quota } = await navigator.storage.estimate();
    return usage === undefined
      ? null
      : { used: usage, most: quota ?? null, kept: await navigator.storage.persisted() };
  } catch {
    return null;
  }
}
