export type FileFormat = 'stl' | '3mf';

const LENGTH_LIMIT = 80;
/** Names that some systems keep for devices, whatever the extension. */
const RESERVED = /^(con|prn|aux|nul|com\d|lpt\d)$/i;
const MARKS = /\p{M}/gu;

const plain = (text: string): string =>
  text
    .normalize('NFKD')
    .replace(MARKS, '')
    .replace(/[^A-Za-z0-9._-]+/g, '-')
    .replace(/-{2,}/g, '-')
    .replace(/^[-._]+/, '')
    .slice(0, LENGTH_LIMIT)
    .replace(/[-._]+$/, '');

/** File name after the design that every system and every header takes: letters, digits, dot, dash, underscore. */
export function exportFileName(title: string, format: FileFormat): string {
  const name = plain(title);
  if (name === '') return `part.${format}`;
  return `${RESERVED.test(name.split('.')[0]!) ? 'part-' : ''}${name}.${format}`;
}
