/** Hands a file to the browser's downloads. */
export function save(file: Blob, name: string): void {
  const link = document.createElement('a');
  link.href = URL.createObjectURL(file);
  link.download = name;
  link.click();
  // The download has its own hold on the data by the next turn of the loop, in every browser after a second.
  setTimeout(() => URL.revokeObjectURL(link.href), 1000);
}
