/** Hands a file to the browser's downloads. */
export function saveBlob(blob: Blob, fileName: string): void {
  const url = URL.createObjectURL(blob);
  const link = document.createElement('a');
  link.href = url;
  link.download = fileName;
  document.body.append(link);
  link.click();
  link.remove();
  setTimeout(() => URL.revokeObjectURL(url), 10_000);
}

/** The name that the server gave it in Content-Disposition (RFC 6266), if any. */
export function fileNameOf(disposition: string | null): string | null {
  const extended = disposition?.match(/filename\*=UTF-8''([^;]+)/i)?.[1];
  if (extended) return decodeURIComponent(extended);
  return disposition?.match(/filename="?([^";]+)"?/i)?.[1] ?? null;
}
