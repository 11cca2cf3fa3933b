import type { Callout, Motion, Stance } from '@/generators/contract';
import type { ParameterValue } from '@/generators/parameters';

export type Paint = 'solid' | 'strain';

export interface BodyFacts {
  readonly name: string;
  readonly triangles: number;
  /** mm3 */
  readonly volume: number;
  /** extent along x, y, z in mm */
  readonly size: readonly [number, number, number];
}

export interface ViewportState {
  readonly status: 'loading' | 'ready' | 'failed' | 'no-webgl';
  readonly message?: string;
  /** time the last build took in the worker, in milliseconds */
  readonly buildMs?: number;
  readonly bodies?: readonly BodyFacts[];
}

export interface ViewportProps {
  /** id of the part family */
  family: string;
  /** parsed, valid parameters */
  values: Readonly<Record<string, ParameterValue>>;
  motion: Motion | null;
  /** moment of the motion, 0 to 1; controlled from outside */
  flex: number;
  paint: Paint;
  /** allowable strain as a fraction, marked on the scale; null where it is not known */
  strainScale: number | null;
  showDimensions: boolean;
  cut: boolean;
  onBed: boolean;
  callouts: readonly Callout[];
  stance: Stance | null;
  /** parameter whose dimension is emphasised */
  highlightField?: string | null;
  onState?(state: ViewportState): void;
}
