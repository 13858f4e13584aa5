/**
 * The name of a file inside an archive or folder as it may be shown and kept: forward slashes, no leading "./".
 * @returns the name, or the reason why it is refused (absolute, climbing out with "..", control characters, too long)
 */
export function safeEntryName(name: string): { name: string } | { refused: string } {
  const path = name.replaceAll('\\', '/').replace(/^(\.\/)+/, '');
  if (path === '') return { refused: 'has no name' };
  if (path.length > 500) return { refused: 'has a name of more than 500 characters' };
  if (path.startsWith('/') || /^[A-Za-z]:/.test(path)) return { refused: 'has an absolute path' };
  if (path.split('/').includes('..')) return { refused: 'has a path that leads out of the archive ("..")' };
  // Control characters and the marks that turn the direction of writing would make a name show as another.
  if (/[\u0000-\u001f\u007f\u200e\u200f\u202a-\u202e\u2066-\u2069]/.test(path)) {
    return { refused: 'has control characters in its name' };
  }
  return { name: path };
}
