/** One state of a solved motion. */
export interface State {
  /** value of the drive, mm or rad, for the meshed half or whole */
  readonly value: number;
  /** force in N or moment in N mm that holds it */
  readonly load: number;
  /** x, y per node, mm */
  readonly u: Float64Array;
}

/** A motion from rest to the target, or how far it got and why no further. */
export interface Path {
  readonly states: readonly State[];
  readonly failure: string | null;
  readonly factorisations: number;
  /** true where an equilibrium on the way is unstable: the part would snap through */
  readonly unstable: boolean;
}
