import { type Fold, type FoldedWeb, foldWeb } from '@/lib/mechanics/web-fold';
import type { Values } from './schema';
import { foldAngleOf, pressedShut, webOf } from './web';

export const foldOf = (p: Values): Fold => ({
  web: webOf(p),
  angle: foldAngleOf(p),
  pressedTo: pressedShut(p) ? 0 : null,
});

export const hingeMechanics = (p: Values): FoldedWeb => foldWeb(foldOf(p));
