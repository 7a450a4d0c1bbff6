/** Puts bytes that the page has into a file where the browser keeps what is downloaded. */
export function saveFile(bytes: Blob, name: string): void {
  const url = URL.createObjectURL(bytes);
  const link = document.createElement('a');
  link.href = url;
  link.download = name;
  link.click();
  // The browser has taken hold of the bytes by the time the next task runs.
  setTimeout(() => URL.revokeObjectURL(url), 0);
}
