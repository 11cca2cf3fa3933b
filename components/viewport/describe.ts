import { formatQuantity, significant } from '@/lib/units';
import type { Peak } from './mesh/prepare';
import type { BodyFacts } from './types';

export const percent = (strain: number): string => formatQuantity(Math.abs(strain), 'strain', 2);

export const bodyWords = (name: string): string => name.replace(/[-_]/g, ' ');

export const sizeWords = ([x, y, z]: BodyFacts['size']): string =>
  `${significant(x)} by ${significant(y)} by ${significant(z)} mm`;

export const pullWords = (strain: number): string => (strain < 0 ? 'compression' : 'tension');

export interface Scene {
  readonly bodies: readonly BodyFacts[];
  readonly moment: {
    readonly label: string;
    readonly share: number;
    readonly by?: string | undefined;
  } | null;
  readonly peak: Peak | null;
  readonly allowable: number | null;
  readonly onBed: boolean;
  readonly cut: boolean;
  /** the place of largest strain is not in what the cut left standing */
  readonly peakCutAway?: boolean;
}

/** The picture in words, for those who do not see it. */
export function describePicture({
  bodies,
  moment,
  peak,
  allowable,
  onBed,
  cut,
  peakCutAway = false,
}: Scene): string {
  const parts = bodies.map(
    ({ name, size, volume }) =>
      `${bodyWords(name)}, ${sizeWords(size)}, volume ${formatQuantity(volume, 'mm3')}`,
  );
  const sentences = [
    `${bodies.length === 1 ? 'One body' : `${bodies.length} bodies`}: ${parts.join('; ')}.`,
    onBed ? 'Laid on the print bed, layers level.' : '',
    cut ? 'Cut open to show the section.' : '',
    moment && moment.share > 0 ? `${moment.label} ${Math.round(100 * moment.share)} % of the way.` : '',
    moment && moment.share > 0 && moment.by && !onBed ? `Bent shape by ${moment.by}, at true scale.` : '',
    peak && !onBed
      ? `Largest strain ${percent(peak.strain)} in ${pullWords(peak.strain)}; allowable ${
          allowable === null ? 'not known' : percent(allowable)
        }.`
      : '',
    peakCutAway ? 'The place of largest strain is cut away, so it is not marked.' : '',
  ];
  return sentences.filter(Boolean).join(' ');
}
