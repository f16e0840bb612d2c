/** Hands a text to the browser as a file to keep. */
export function saveFile(fileName: string, text: string): void {
  saveBlob(fileName, new Blob([text], { type: 'application/json' }));
}

/** Hands any contents to the browser as a file to keep. */
export function saveBlob(fileName: string, contents: Blob): void {
  const address = URL.createObjectURL(contents);
  const link = document.createElement('a');
  link.href = address;
  link.download = fileName;
  link.click();
  // The browser reads the address after the click; letting go of it at once loses the file in some.
  setTimeout(() => URL.revokeObjectURL(address), 60_000);
}
