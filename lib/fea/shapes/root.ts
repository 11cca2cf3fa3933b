import type { Support } from '../model';
import type { Corner } from '../profile/outline';

/**
 * What an arm grows from. rigid: nothing gives. base: a plate or block of the same width as the arm, `span` long and
 * `thickness` deep, held at its two ends and, where `bottom` is true, underneath as well.
 */
export type Root =
  | { readonly kind: 'rigid' }
  | { readonly kind: 'base'; readonly thickness: number; readonly span: number; readonly bottom: boolean };

export const rootSupports = (root: Root): Support[] => {
  if (root.kind === 'rigid') return [{ tag: 'root', fix: 'both' }];
  const sides: Support = { tag: 'side', fix: 'both' };
  return root.bottom ? [sides, { tag: 'bottom', fix: 'both' }] : [sides];
};

/** Radius of the roundings where the arm leaves its base, mm; 0 for a sharp corner. */
export interface RootFillets {
  readonly front: number;
  readonly back: number;
}

/**
 * Corners from the arm's back round the base to its front, arm along +y with its root at y = 0. The edge leaving
 * the last corner is the arm's front face, tagged `front`; fillets are tagged `front-fillet` and `back-fillet`.
 */
export function rootCorners(root: Root, thickness: number, fillets: RootFillets): Corner[] {
  const half = thickness / 2;
  const front: Corner = { at: [half, 0], radius: fillets.front, tag: 'front', filletTag: 'front-fillet' };
  if (root.kind === 'rigid') {
    return [
      { at: [-half, 0], tag: 'root', size: thickness / 8 },
      { at: [half, 0], tag: 'front' },
    ];
  }
  const reach = root.span / 2;
  return [
    { at: [-half, 0], radius: fillets.back, tag: 'deck', filletTag: 'back-fillet' },
    { at: [-reach, 0], tag: 'side' },
    { at: [-reach, -root.thickness], tag: 'bottom' },
    { at: [reach, -root.thickness], tag: 'side' },
    { at: [reach, 0], tag: 'deck' },
    front,
  ];
}
