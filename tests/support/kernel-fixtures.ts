import { type Kernel, type Loop, type NamedSolid, QUALITY, type Vec2 } from '@/lib/geometry/kernel';
import { compose, rotation, translation } from '@/lib/geometry/placement';

type Make = (kernel: Kernel) => readonly NamedSolid[];

/** A plate with rounded corners and a bore, cut by a boolean. */
export const platePart: Make = (kernel) => {
  const plate = kernel.extrude(kernel.outlines.rectangle(40, 20, { cornerRadius: 3 }), 6);
  const bore = kernel.place(kernel.cylinder(4, 8), translation([0, 0, -1]));
  return [{ name: 'plate', solid: kernel.subtract(plate, [bore]) }];
};

/** A ring of rectangular section, revolved. */
export const ringPart: Make = (kernel) => {
  const section = kernel.outlines.rectangle(4, 5, { center: [12, 2.5] });
  return [{ name: 'ring', solid: kernel.revolve(section) }];
};

/** A grip ring of 96 ribs: one outline with a hole, extruded. */
export const ribbedPart: Make = (kernel) => {
  const outline: Vec2[] = Array.from({ length: 384 }, (_, at) => {
    const radius = at % 4 < 2 ? 15 : 14.2;
    const angle = (2 * Math.PI * at) / 384;
    return [radius * Math.cos(angle), radius * Math.sin(angle)];
  });
  const bore = kernel.outlines.circle(12);
  return [
    { name: 'grip', solid: kernel.extrude(kernel.outlines.subtract({ loops: [outline] }, [bore]), 10) },
  ];
};

/** Raised letters on a plate, sunk into it by 0.4 mm. */
export const lettersPart: Make = (kernel) => {
  const plate = kernel.extrude(kernel.outlines.rectangle(60, 14, { center: [26, 4] }), 2);
  const letters = kernel.extrude(kernel.outlines.text('PETG 0.30', { height: 7, stroke: 0.9 }), 1);
  return [{ name: 'plate', solid: kernel.union([plate, kernel.place(letters, translation([0, 0, 1.6]))]) }];
};

/** Two crossed bars with a bore through their middle, and the plug of that bore as a body of its own. */
export const crossedPart: Make = (kernel) => {
  const bar = kernel.box([30, 8, 8]);
  const turned = kernel.place(bar, compose(translation([0, 0, 0.5]), rotation('z', 1)));
  const core = kernel.place(kernel.cylinder(3, 30), translation([0, 0, -15]));
  return [
    { name: 'cross', solid: kernel.subtract(kernel.union([bar, turned]), [core]) },
    { name: 'plug', solid: kernel.intersect([bar, turned, core]) },
  ];
};

export const FIXTURES: Readonly<Record<string, Make>> = {
  plate: platePart,
  ring: ringPart,
  'ribbed grip': ribbedPart,
  letters: lettersPart,
  'crossed bars': crossedPart,
};

/** Area of a regular polygon of n sides on a circle of the given radius. */
export const polygonArea = (radius: number, sides: number) =>
  (sides / 2) * radius * radius * Math.sin((2 * Math.PI) / sides);

export const QUALITIES = Object.values(QUALITY);

/** A closed box mesh, corners at the origin and at `size`, triangles looking outward. */
export function boxMesh([x, y, z]: readonly [number, number, number]) {
  const positions = new Float32Array(
    [0, 1, 2, 3, 4, 5, 6, 7].flatMap((at) => [at & 1 ? x : 0, at & 2 ? y : 0, at & 4 ? z : 0]),
  );
  const quads = [
    [0, 2, 3, 1],
    [4, 5, 7, 6],
    [0, 1, 5, 4],
    [2, 6, 7, 3],
    [0, 4, 6, 2],
    [1, 3, 7, 5],
  ];
  const indices = new Uint32Array(quads.flatMap(([a, b, c, d]) => [a!, b!, c!, a!, c!, d!]));
  return { positions, indices };
}

export const square = (size: number, [x, y]: Vec2 = [0, 0]): Loop => [
  [x, y],
  [x + size, y],
  [x + size, y + size],
  [x, y + size],
];
