import { type MeshOptions, RECOMMENDED_MESH } from '../mesh/options';

export interface SolveOptions {
  readonly mesh: MeshOptions;
  /** `small`: one linear solve, for the first answer; `large`: large displacement and strain */
  readonly displacement: 'small' | 'large';
  /** law at large displacement; St-Venant reads tension low and is kept for comparison with other programs */
  readonly law: 'neo-hooke' | 'st-venant';
  /** states kept on the way to the full deflection, large displacement only */
  readonly steps: number;
  /** most degrees of freedom; past it the solve is refused */
  readonly mostUnknowns: number;
}

export const LINEAR: SolveOptions = {
  mesh: RECOMMENDED_MESH,
  displacement: 'small',
  law: 'neo-hooke',
  steps: 1,
  mostUnknowns: 20_000,
};

export const NON_LINEAR: SolveOptions = { ...LINEAR, displacement: 'large', steps: 4 };
