import type { Source } from '@/lib/materials/types';

export const GEOMETRY: Source = { text: 'Gaps as drawn', mark: 'computed' };
export const WALL: Source = {
  text: 'Three lines of a 0.4 mm nozzle keep a wall from giving (common practice, no source)',
  mark: 'common-practice',
};
export const NO_TABLE: Source = { text: 'Clearance notes are for printed parts', mark: 'common-practice' };
