export interface StorageSpace {
  /** Bytes. How much there is room for is not told: browsers give a made-up figure for that. */
  used: number;
  /** Whether the browser has promised not to clear it away by itself. */
  kept: boolean;
}

/** How much room the surveys take; null where the browser does not say. */
export async function storageSpace(): Promise<StorageSpace | null> {
  try {
    const { usage } = await navigator.storage.estimate();
    return usage === undefined ? null : { used: usage, kept: await navigator.storage.persisted() };
  } catch {
    return null;
  }
}
