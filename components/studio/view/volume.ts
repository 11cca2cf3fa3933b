import type { ViewportState } from '@/components/viewport/types';

/** mm3 of all bodies; null while none is made, for a part that is not there yet is not a part of no weight. */
export function volumeOf({ bodies = [] }: ViewportState): number | null {
  return bodies.length === 0 ? null : bodies.reduce((sum, body) => sum + body.volume, 0);
}
