import { describe, expect, it } from 'vitest';
import { stVenant } from '@/lib/fea/element/law';
import { arc, line, type Point, type Segment } from '@/lib/fea/profile/segment';
import { heldBy, nodesOn } from '@/lib/fea/solve/supports';
import { multiply } from '@/lib/fea/solver/multiply';
import { surfaceStrain } from '@/lib/fea/strain/surface';
import { type SSpring, springHeight, springStiffness } from '@/lib/mechanics/s-spring';
import { linearProblem, meshed } from '@/tests/support/plane-models';

/** Plates under the spring, mm: 3 thick, wide, held at their far face. */
const SOLE = 3;
const WIDE = 8;
const NUMBERS = { modulus: 100, poisson: 0.4 } as const;

/** One face of the lower half, from the plate to the middle of the spring: `side` 1 right, -1 left of the path. */
function face({ radius: r, leg, thickness, foot: f }: SSpring, side: 1 | -1): Segment[] {
  const t = thickness / 2;
  const turn = Math.PI / 2;
  const [near, far] = [r - side * t, r + side * t];
  const level = f + near;
  return [
    arc([side * (t + f), f], f, -turn, side > 0 ? -turn : turn, 'fillet'),
    arc([r, f], near, Math.PI, -turn, 'bend'),
    ...(leg > 0 ? [line([r, level], [r + leg, level], 'leg')] : []),
    arc([r + leg, f + 2 * r], far, -turn, Math.PI, 'bend'),
  ];
}

/** A segment turned by half a turn about the middle of the spring. */
function turned(
  { kind, x0, y0, x1, y1, cx, cy, radius, start, sweep, tag }: Segment,
  height: number,
): Segment {
  const at = (x: number, y: number): Point => [-x, height - y];
  return kind === 'line'
    ? line(at(x0, y0), at(x1, y1), tag)
    : arc(at(cx, cy), radius, start + Math.PI, sweep, tag);
}

const reversed = ({ kind, x0, y0, x1, y1, cx, cy, radius, start, sweep, tag }: Segment): Segment =>
  kind === 'line' ? line([x1, y1], [x0, y0], tag) : arc([cx, cy], radius, start + sweep, -sweep, tag);

function profileOf(spring: SSpring): Segment[] {
  const height = springHeight(spring);
  const [right, left] = [face(spring, 1), face(spring, -1)];
  const base = spring.thickness / 2 + spring.foot;
  const reach = spring.radius + spring.leg;
  const [upper, lower] = [(height + spring.thickness) / 2, (height - spring.thickness) / 2];
  const back = (segments: Segment[]) => [...segments].reverse().map(reversed);
  const over = (segments: Segment[]) => segments.map((segment) => turned(segment, height));
  return [
    line([-base, 0], [-base - WIDE, 0], 'plate'),
    line([-base - WIDE, 0], [-base - WIDE, -SOLE], 'plate'),
    line([-base - WIDE, -SOLE], [base + WIDE, -SOLE], 'bottom'),
    line([base + WIDE, -SOLE], [base + WIDE, 0], 'plate'),
    line([base + WIDE, 0], [base, 0], 'plate'),
    ...right,
    line([reach, upper], [-reach, upper], 'leg'),
    ...back(over(left)),
    line([base, height], [base + WIDE, height], 'plate'),
    line([base + WIDE, height], [base + WIDE, height + SOLE], 'plate'),
    line([base + WIDE, height + SOLE], [-base - WIDE, height + SOLE], 'top'),
    line([-base - WIDE, height + SOLE], [-base - WIDE, height], 'plate'),
    line([-base - WIDE, height], [-base, height], 'plate'),
    ...over(right),
    line([-reach, lower], [reach, lower], 'leg'),
    ...back(left),
  ];
}

/** Stiffness and greatest surface strain of the spring as a plane body, its upper edge moved by 1 mm. */
function computed(spring: SSpring, direction: 'axial' | 'sway') {
  const mesh = meshed({ loops: [profileOf(spring)] }, { perThickness: 3 });
  const problem = linearProblem(mesh, 'plane-stress', stVenant(NUMBERS, 'plane-stress'));
  const held = heldBy(mesh, [
    { tag: 'bottom', fix: 'both' },
    { tag: 'top', fix: 'both' },
  ]);
  const offset = direction === 'axial' ? 1 : 0;
  const moved = new Float64Array(2 * mesh.nodeCount);
  for (const node of nodesOn(mesh, 'top')) moved[2 * node + offset] = direction === 'axial' ? -1 : 1;
  const u = problem.solve(new Float64Array(moved.length), held, moved);
  const force = multiply(mesh, problem.stiffness, u);
  const stiffness = nodesOn(mesh, 'top').reduce((sum, node) => sum + force[2 * node + offset]!, 0);
  const { along } = surfaceStrain(mesh, 'plane-stress', ['bend', 'leg'], u, false);
  const strain = along.reduce((most, one) => (Number.isNaN(one) ? most : Math.max(most, Math.abs(one))), 0);
  return { stiffness: Math.abs(stiffness), strain };
}

const SPRINGS: readonly SSpring[] = [
  { radius: 3.5, leg: 3, thickness: 2.4, foot: 0.8 },
  { radius: 3, leg: 5, thickness: 1.6, foot: 1 },
  { radius: 6, leg: 0, thickness: 2, foot: 1.5 },
  { radius: 2.5, leg: 12, thickness: 1.2, foot: 0.6 },
  { radius: 3, leg: 2, thickness: 3, foot: 1 },
];

describe('S-springs against plane finite elements', () => {
  it.each(SPRINGS.map((spring) => [Object.values(spring).join(' x '), spring] as const))(
    'sink and sway as stiffly, and strain as much sinking: %s',
    (_, spring) => {
      const told = springStiffness(spring, { ...NUMBERS, width: 1 });
      const axial = computed(spring, 'axial');
      const sway = computed(spring, 'sway');
      expect(Math.abs(told.axial / axial.stiffness - 1)).toBeLessThan(0.05);
      expect(Math.abs(told.sway / sway.stiffness - 1)).toBeLessThan(0.02);
      expect(Math.abs(told.axialStrain / axial.strain - 1)).toBeLessThan(0.03);
    },
  );
});
