import { describe, expect, it } from 'vitest';
import type { BendingModel } from '@/lib/fea/model';
import { openRingModel } from '@/lib/fea/shapes/open-ring';
import { tubeModel } from '@/lib/fea/shapes/tube';
import { uArmModel } from '@/lib/fea/shapes/u-arm';
import { webModel } from '@/lib/fea/shapes/web';
import { LINEAR, NON_LINEAR, type SolveOptions } from '@/lib/fea/solve/options';
import type { Solved } from '@/lib/fea/solve/solution';
import { solveBending } from '@/lib/fea/solve/solve-bending';
import { REFERENCE, solved } from '@/tests/support/plane-models';
import { type Case, casesOf, percent, plainArm, rollerArm } from './cases';

/*
 * The plane solver at the recommended mesh against tests/reference/finite-elements (CalculiX, see its SOURCE.md):
 * force within 2 %, peak strain within 3 %. Kinds left out: torsion is not plane; root_Q with a wall wider than the
 * arm, or an arm in the plane of the wall, is three-dimensional (families multiply by factors there).
 */
const FORCE = 2;
const STRAIN = 3;
const BLOCK = { kind: 'base', thickness: 20, span: 40, bottom: true } as const;
const NARROW = { kind: 'even', width: 1 } as const;

const bend = (model: BendingModel, options: SolveOptions = LINEAR): Solved =>
  solved(solveBending(model, REFERENCE, options));
const force = (solution: Solved): number => Math.abs(solution.steps.at(-1)!.force);
const ids = (cases: readonly Case[]) => cases.map((one) => [one.id, one] as const);

function expectForce(solution: Solved, expected: number): void {
  expect(Math.abs(percent(force(solution), expected))).toBeLessThan(FORCE);
}

function expectStrain(solution: Solved, expected: number, within = STRAIN): void {
  expect(Math.abs(percent(solution.tension.strain, expected))).toBeLessThan(within);
}

describe('straight arms on a root that beam theory assumes', () => {
  it.each(ids([...casesOf('cantilever'), ...casesOf('tapered_thickness')]))(
    '%s',
    (_, { inputs, expected }) => {
      const { L, h, b, y, taper } = inputs;
      const arm = { length: L, thickness: h, width: { kind: 'even', width: b } as const, deflection: y };
      const solution = bend(rollerArm(taper ? { ...arm, tip: h / 2 } : arm));
      expectForce(solution, expected.force!);
      expectStrain(solution, expected.strain!);
    },
  );

  // Exception: 3.4 % low in strain. The reference is three-dimensional: slanted sides unload the corners of the
  // root, so mid-width carries more than the mean. Families multiply tapered widths by 1.08 for it.
  it.each(ids(casesOf('tapered_width')))('%s, within 4 %% in strain', (_, { inputs, expected }) => {
    const { L, h, b, y } = inputs;
    const width = {
      kind: 'stations',
      along: 'y',
      stations: [
        [0, b],
        [L, b / 4],
      ],
    } as const;
    const solution = bend(rollerArm({ length: L, thickness: h, width, deflection: y }));
    expectForce(solution, expected.force!);
    expectStrain(solution, expected.strain!, 4);
  });

  it.each(ids(casesOf('short_beam')))('%s', (_, { inputs, expected }) => {
    const { L, h, b } = inputs;
    const arm = { length: L, thickness: h, width: { kind: 'even', width: b } as const, deflection: 1 };
    const solution = bend(rollerArm(arm));
    expectForce(solution, expected.force_per_mm!);
    expectStrain(solution, expected.strain_per_mm!);
    expectForce(bend(plainArm({ ...arm, root: { kind: 'rigid' } })), expected.force_per_mm_clamped!);
  });

  // the reference is linear between Green-Lagrange strain and second Piola-Kirchhoff stress
  it.each(ids(casesOf('large_deflection')))('%s', (_, { inputs, expected }) => {
    const { L, h, b, y } = inputs;
    const arm = rollerArm({ length: L, thickness: h, width: { kind: 'even', width: b }, deflection: y });
    const solution = bend(arm, { ...NON_LINEAR, law: 'st-venant' });
    expect(solution.fellBack).toBeNull();
    expectForce(solution, expected.force!);
    expectStrain(solution, expected.strain!);
  });
});

describe('arms with root fillets on blocks and plates', () => {
  it.each(ids(casesOf('fillet_local_strain')))('%s', (id, { inputs, expected }) => {
    const { L, h, R } = inputs;
    const thickness = id.includes('tw=2h') ? 2 * h : h;
    const root = id.includes('block')
      ? BLOCK
      : ({ kind: 'base', thickness, span: 40, bottom: false } as const);
    const solution = bend(
      plainArm({ length: L, thickness: h, fillet: R, root, width: NARROW, deflection: 1 }),
    );
    expectForce(solution, expected.force_per_mm_per_width!);
    expectStrain(solution, expected.local_strain_per_mm!);
  });

  it.each(ids(casesOf('root_Q').filter(({ inputs }) => inputs.W === inputs.b && inputs.tw)))(
    '%s: a sharp corner, force only',
    (_, { inputs, expected }) => {
      const { L, h, b, tw, span } = inputs;
      const root = { kind: 'base', thickness: tw, span, bottom: false } as const;
      const width = { kind: 'even', width: b } as const;
      const solution = bend(plainArm({ length: L, thickness: h, root, width, deflection: 1 }));
      expectForce(solution, expected.force_per_mm!);
    },
  );
});

describe('curved parts', () => {
  it.each(ids(casesOf('c_clip')))('open ring %s', (_, { inputs, expected }) => {
    const { R, t, b, opening_deg } = inputs;
    const solution = bend(
      openRingModel({
        radius: R - t / 2,
        thickness: t,
        opening: (opening_deg * Math.PI) / 180,
        lips: 'cut',
        foot: null,
        width: b,
        spread: 1,
      }),
    );
    expectForce(solution, expected.force_per_mm!);
    expectStrain(solution, expected.strain_per_mm!);
  });

  it.each(ids(casesOf('u_arm')))('U arm %s', (_, { inputs, expected }) => {
    const { L1, L2, gap_radius, h, b } = inputs;
    const solution = bend(
      uArmModel({
        rise: L1,
        fall: L2,
        bend: gap_radius,
        thickness: h,
        root: { kind: 'rigid' },
        fillets: { front: 0, back: 0 },
        width: b,
        opening: 1,
      }),
    );
    expectForce(solution, expected.force_per_mm!);
    expectStrain(solution, expected.strain_per_mm!);
  });

  it.each(ids(casesOf('annular')))('ring on a shaft %s', (_, { inputs, expected }) => {
    const { ri, s, y_radial, x_from_end } = inputs;
    const solution = bend(
      tubeModel({
        innerRadius: ri,
        wall: s,
        length: 60,
        pressedAt: x_from_end,
        band: s / 4,
        growth: y_radial,
      }),
    );
    expectForce(solution, expected.radial_force!);
    expectStrain(solution, expected.peak_strain!);
  });
});

describe('living hinges folded with neo-Hooke', () => {
  it.each(ids(casesOf('living_hinge')))('%s', (_, { inputs, expected }) => {
    const { t, Lw, theta_deg, plate, fillet, layout, sign } = inputs;
    const way = sign === 'fillet side in tension' ? -1 : 1;
    const solution = bend(
      webModel({
        length: Lw,
        thickness: t,
        leaf: plate,
        leafLength: 2 * plate,
        fillet,
        relief: layout === 'centre' ? (plate - t) / 2 : 0,
        angle: (way * theta_deg * Math.PI) / 180,
        width: 1,
      }),
      NON_LINEAR,
    );
    expect(solution.fellBack).toBeNull();
    expectStrain(solution, expected.local_strain!);
  });
});
