import { countedPeak } from '@/generators/computed';
import type { BendingPlane } from '@/generators/contract';
import { momentAt } from '@/lib/fea/preview/between';
import type { Solved } from '@/lib/fea/solve/solution';
import { degrees, formatQuantity } from '@/lib/units';

/** What is read off the solved movement at a moment. */
export interface Reading {
  /** mm, or degrees for a turn; without sign */
  readonly deflection: number;
  /** N, or N mm for a turn; null where the plastic's modulus is not known */
  readonly load: number | null;
  /** of the marked place, tension positive */
  readonly strain: number;
}

/** Shares of the full movement at which a state was solved. */
export function stepShares({ steps }: Solved): readonly number[] {
  const full = steps.at(-1)!.deflection;
  return steps.map(({ deflection }) => deflection / full);
}

/** Load at a share of the movement, straight between the load steps. */
function loadAt(solution: Solved, t: number): number {
  const shares = [0, ...stepShares(solution)];
  const loads = [0, ...solution.steps.map(({ force }) => Math.abs(force))];
  const next = Math.max(
    1,
    shares.findIndex((share) => share >= t - 1e-9),
  );
  const part = (t - shares[next - 1]!) / (shares[next]! - shares[next - 1]!);
  return loads[next - 1]! + part * (loads[next]! - loads[next - 1]!);
}

export function readingAt(solution: Solved, plane: BendingPlane, t: number): Reading {
  const full = Math.abs(solution.steps.at(-1)!.deflection);
  const strain = t === 0 ? 0 : momentAt(solution, t).strain[countedPeak(solution, plane).node]!;
  return {
    deflection: t * (plane.model.drive.kind === 'rotation' ? degrees(full) : full),
    load: plane.modulus === null ? null : loadAt(solution, t),
    strain,
  };
}

export function readingWords({ deflection, load, strain }: Reading, plane: BendingPlane): string {
  const turns = plane.model.drive.kind === 'rotation';
  const parts = [
    turns ? `turned ${formatQuantity(deflection, 'deg')}` : `deflected ${formatQuantity(deflection, 'mm')}`,
    load !== null && `${turns ? 'moment' : 'force'} ${formatQuantity(load, turns ? 'Nmm' : 'N')}`,
    `strain ${formatQuantity(Math.abs(strain), 'strain')}${strain === 0 ? '' : strain < 0 ? ' in compression' : ' in tension'}`,
  ];
  return parts.filter(Boolean).join(', ');
}
