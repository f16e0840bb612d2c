/** Whether this device has a share sheet that takes files. */
export function canShareFiles(): boolean {
  const sample = new File(['x'], 'x.pdf', { type: 'application/pdf' });
  return typeof navigator.canShare === 'function' && navigator.canShare({ files: [sample] });
}

/**
 * Opens the share sheet with a file. A browser opens it only shortly after a tap: `tap-again` where that was too long ago;
 * closing the sheet is no fault.
 */
export async function shareFile(file: File): Promise<'shared' | 'left' | 'tap-again'> {
  try {
    await navigator.share({ files: [file], title: file.name });
    return 'shared';
  } catch (error) {
    const name = error instanceof DOMException ? error.name : '';
    if (name === 'AbortError') return 'left';
    if (name === 'NotAllowedError') return 'tap-again';
    throw error;
  }
}
