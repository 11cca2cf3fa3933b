import type { Kernel, NamedSolid } from '@/lib/geometry/kernel';
import { revolvedVolume } from '@/lib/geometry/thread-bodies';
import type { Values } from './schema';
import { section } from './section';

/** One body "plug": flange on z = 0, the plug up. */
export const build = (p: Values, kernel: Kernel): NamedSolid[] => [
  { name: 'plug', solid: kernel.revolve({ loops: [section(p)] }) },
];

/** Volume of the faceted body, mm3. */
export const volumes = (p: Values, segmentsPerTurn: number): Readonly<Record<string, number>> => ({
  plug: revolvedVolume(section(p), segmentsPerTurn),
});
