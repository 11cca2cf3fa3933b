import type { PresetVersion } from '@/lib/access/presets';

export type Licence = PresetVersion['licence'];

interface About {
  readonly name: string;
  readonly means: string;
  readonly deed: string;
}

const deed = (path: string): string => `https://creativecommons.org/${path}/`;

/** The Creative Commons licences by their SPDX identifiers, in plain words. */
export const LICENCES: Readonly<Record<Licence, About>> = {
  'CC0-1.0': { name: 'CC0 1.0', means: 'no rights kept', deed: deed('publicdomain/zero/1.0') },
  'CC-BY-4.0': { name: 'CC BY 4.0', means: 'name the author', deed: deed('licenses/by/4.0') },
  'CC-BY-SA-4.0': {
    name: 'CC BY-SA 4.0',
    means: 'name the author, pass on under the same licence',
    deed: deed('licenses/by-sa/4.0'),
  },
  'CC-BY-NC-4.0': {
    name: 'CC BY-NC 4.0',
    means: 'name the author, not for sale',
    deed: deed('licenses/by-nc/4.0'),
  },
  'CC-BY-NC-SA-4.0': {
    name: 'CC BY-NC-SA 4.0',
    means: 'name the author, not for sale, same licence',
    deed: deed('licenses/by-nc-sa/4.0'),
  },
  'CC-BY-ND-4.0': {
    name: 'CC BY-ND 4.0',
    means: 'name the author, pass on unchanged',
    deed: deed('licenses/by-nd/4.0'),
  },
  'CC-BY-NC-ND-4.0': {
    name: 'CC BY-NC-ND 4.0',
    means: 'name the author, not for sale, unchanged',
    deed: deed('licenses/by-nc-nd/4.0'),
  },
};

export const LICENCE_OPTIONS = Object.entries(LICENCES).map(([value, { name, means }]) => ({
  value,
  label: `${name}: ${means}`,
}));
