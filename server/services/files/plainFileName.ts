const MAX_NAME = 200;

/** The last part of a file's name, without signs that do something, cut to length. */
export function plainFileName(name: string): string {
  const last = name.split(/[/\\]/).at(-1)!;
  // Control signs and direction marks never reach a page or a header.
  const plain = last.replace(/[\p{Cc}\p{Cf}]/gu, '').trim();
  return plain.slice(-MAX_NAME) || 'survey';
}
