/** Hands the browser a file that was made on the page. */
export function saveFile(name: string, media: string, text: string): void {
  const address = URL.createObjectURL(new Blob([text], { type: `${media};charset=utf-8` }));
  const link = document.createElement('a');
  link.href = address;
  link.download = name;
  link.click();
  URL.revokeObjectURL(address);
}
