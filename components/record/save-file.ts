/** Hands a text made in the browser over as a file; nothing is sent anywhere. */
export function saveFile(name: string, type: string, text: string): void {
  const address = URL.createObjectURL(new Blob([text], { type }));
  const link = document.createElement('a');
  link.href = address;
  link.download = name;
  link.click();
  URL.revokeObjectURL(address);
}

/** A file's name out of a garment's: letters and figures, joined by dashes. */
export const fileName = (name: string, ending: string): string =>
  `${name
    .normalize('NFKD')
    .replace(/[^\p{L}\p{N}]+/gu, '-')
    .replace(/^-+|-+$/g, '')
    .slice(0, 60)
    .toLowerCase()}.${ending}`;
