/** The most characters that are kept of a file's name. */
const NAME_MAX = 200;

/** A file's own name, without folders, control signs or signs that turn the reading direction; “table” where nothing is left. */
export function cleanFileName(name: string): string {
  const last = name.normalize('NFC').split(/[\\/]/).at(-1) ?? '';
  const shown = last.replace(/[\p{Cc}\p{Cf}\u2028\u2029<>:"|?*]/gu, '').trim();
  const plain = shown.replace(/^\.+/, '');
  if (plain === '') return 'table';
  if (plain.length <= NAME_MAX) return plain;
  const ending = /\.[a-z0-9]{1,8}$/i.exec(plain)?.[0] ?? '';
  return plain.slice(0, NAME_MAX - ending.length) + ending;
}
