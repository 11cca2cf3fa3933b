import cases from '../reference/finite-elements/cases.json';

export type CaseKind =
  | 'cantilever'
  | 'tapered_thickness'
  | 'tapered_width'
  | 'root_Q'
  | 'fillet_local_strain'
  | 'short_beam'
  | 'large_deflection'
  | 'c_clip'
  | 'living_hinge'
  | 'annular'
  | 'torsion'
  | 'u_arm';

/** One solved case; see tests/reference/finite-elements/SOURCE.md. */
export interface FiniteElementCase {
  readonly id: string;
  readonly kind: CaseKind;
  readonly inputs: Readonly<Record<string, number | string | null>>;
  readonly expected: Readonly<Record<string, number>>;
}

/** Modulus and Poisson ratio of every case but the hinges. MPa. */
export const CASE_MODULUS = 1500;
export const CASE_POISSON = 0.35;

/** Every solved case of a kind. */
export function casesOf(kind: CaseKind): readonly FiniteElementCase[] {
  const found = (cases as unknown as FiniteElementCase[]).filter((entry) => entry.kind === kind);
  if (found.length === 0) throw new Error(`no finite-element case of kind ${kind}`);
  return found;
}

/** A numeric input of a case; throws where it is missing, so that no check passes on a blank. */
export function input(of: FiniteElementCase, name: string): number {
  const value = of.inputs[name];
  if (typeof value !== 'number') throw new Error(`${of.id}: no number "${name}"`);
  return value;
}

/** An expected figure of a case. */
export function expected(of: FiniteElementCase, name: string): number {
  const value = of.expected[name];
  if (value === undefined) throw new Error(`${of.id}: no expected "${name}"`);
  return value;
}

/** Error of a value against the reference, in percent. */
export const errorPercent = (value: number, reference: number): number => 100 * (value / reference - 1);
