/** Hands a text or what is packed already to the browser as a file to keep. */
export function saveFile(name: string, type: string, content: string | Blob): void {
  const address = URL.createObjectURL(new Blob([content], { type }));
  const link = document.createElement('a');
  link.href = address;
  link.download = name;
  link.click();
  // Some browsers start reading after the click has returned.
  setTimeout(() => URL.revokeObjectURL(address), 10_000);
}

/** A file's name from a title: letters and digits of any script, dashes between. */
export function fileName(title: string, ending: string): string {
  const stem = title
    .toLowerCase()
    .normalize('NFKD')
    .replace(/\p{M}/gu, '')
    .replace(/[^\p{L}\p{N}]+/gu, '-')
    .replace(/^-|-$/g, '')
    .slice(0, 60);
  return `${stem || 'study'}.${ending}`;
}
