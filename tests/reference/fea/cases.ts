import type { BendingModel } from '@/lib/fea/model';
import { cantileverModel } from '@/lib/fea/shapes/cantilever';
import type { Root } from '@/lib/fea/shapes/root';
import { casesOf as allOf, type CaseKind } from '@/tests/support/finite-elements';

export interface Case {
  readonly id: string;
  readonly kind: string;
  // biome-ignore lint/suspicious/noExplicitAny: each kind has inputs of its own
  readonly inputs: any;
  readonly expected: Readonly<Record<string, number>>;
}

export const casesOf = (kind: CaseKind): readonly Case[] => allOf(kind) as readonly Case[];

const SHARP = { front: 0, back: 0 };

/** A plain arm without a catch, pushed at its end face. */
export function plainArm(given: {
  length: number;
  thickness: number;
  tip?: number;
  width: BendingModel['width'];
  deflection: number;
  root: Root;
  fillet?: number;
}): BendingModel {
  const fillet = given.fillet ?? 0;
  return cantileverModel({
    length: given.length,
    thickness: given.thickness,
    tipThickness: given.tip ?? given.thickness,
    catch: null,
    root: given.root,
    fillets: fillet > 0 ? { front: fillet, back: fillet } : SHARP,
    width: given.width,
    deflection: given.deflection,
  });
}

/**
 * The same arm on a root face that cannot move along the arm but may thin, sheared parabolically at both ends: the
 * state of beam theory, without the singular corner of a clamped face.
 */
export function rollerArm(given: Omit<Parameters<typeof plainArm>[0], 'root'>): BendingModel {
  const arm = plainArm({ ...given, root: { kind: 'rigid' } });
  return {
    ...arm,
    supports: [
      { tag: 'root', fix: 'y' },
      { corner: [-given.thickness / 2, 0], fix: 'x' },
    ],
    drive: {
      kind: 'displacement',
      lands: [
        { tag: 'land', direction: [-1, 0], spread: 'parabolic' },
        { tag: 'root', direction: [1, 0], spread: 'parabolic' },
      ],
      value: given.deflection,
    },
    peakTags: ['front'],
  };
}

/** Difference in percent. */
export const percent = (value: number, expected: number): number => 100 * (value / expected - 1);
