import type { Source } from '@/lib/materials/types';

export const GEOMETRY: Source = { text: 'Threads as drawn', mark: 'computed' };
export const OVERLAP: Source = {
  text: 'A printed thread wants half of its depth engaged (common practice, no source)',
  mark: 'common-practice',
};
export const NO_TABLE: Source = { text: 'Clearance notes are for printed parts', mark: 'common-practice' };
