import { significant } from '@/lib/units';

export const ENCLOSURE_WORDS = {
  needed: 'Needs an enclosed printer',
  helpful: 'Prints in the open, better enclosed',
  'not-needed': 'Prints in the open',
} as const;

export const enclosureWords = (enclosure: keyof typeof ENCLOSURE_WORDS | null): string =>
  enclosure === null ? 'Enclosure: not known' : ENCLOSURE_WORDS[enclosure];

export const sizeWords = (size: readonly [number, number, number]): string =>
  `${size.map((edge) => significant(edge, 3)).join(' × ')} mm`;

export const reportWords = (worked: number, failed: number): string => {
  if (worked + failed === 0) return 'No reports yet';
  return `Worked for ${worked}${failed > 0 ? `, not for ${failed}` : ''}`;
};
