import { beforeAll, describe, expect, it } from 'vitest';
import { createKernelHost, type KernelHost } from '@/lib/geometry/host';
import { type Kernel, KernelError, type NamedSolid, QUALITY, type Solid } from '@/lib/geometry/kernel';
import { meshFaults, meshVolume } from '@/lib/geometry/mesh-check';
import { rotation, translation } from '@/lib/geometry/placement';
import { boxMesh, FIXTURES, polygonArea, QUALITIES, square } from '@/tests/support/kernel-fixtures';

let host: KernelHost;
beforeAll(async () => {
  host = await createKernelHost();
});

const one =
  (make: (kernel: Kernel) => Solid) =>
  (kernel: Kernel): NamedSolid[] => [{ name: 'body', solid: make(kernel) }];
const build = (make: (kernel: Kernel) => Solid, quality = QUALITY.preview) =>
  host.build(one(make), quality)[0]!;
const refusal = (make: (kernel: Kernel) => Solid) => {
  try {
    build(make);
  } catch (error) {
    return error;
  }
  return null;
};

describe('bodies of the fixtures', () => {
  for (const quality of QUALITIES) {
    for (const [name, make] of Object.entries(FIXTURES)) {
      it(`closes the ${name} at ${quality.name} quality`, () => {
        for (const body of host.build(make, quality)) {
          expect(meshFaults(body.mesh)).toEqual([]);
          expect(body.volume).toBeCloseTo(meshVolume(body.mesh), 9);
          expect(body.bounds.every(Number.isFinite)).toBe(true);
        }
      });
    }
  }

  it('holds no negative zero, so that equal shapes give equal bytes', () => {
    const bodies = Object.values(FIXTURES).flatMap((make) => host.build(make, QUALITY.preview));
    expect(bodies.flatMap(({ mesh }) => [...mesh.positions]).filter((value) => Object.is(value, -0))).toEqual(
      [],
    );
  });

  it('gives the same bytes each time', () => {
    for (const make of Object.values(FIXTURES)) {
      expect(host.build(make, QUALITY.preview)).toEqual(host.build(make, QUALITY.preview));
    }
  });
});

describe('volumes against closed forms', () => {
  it('is length times width times height for a box', () => {
    const body = build((kernel) => kernel.box([3, 4, 5], [10, 0, 0]));
    expect(body.volume).toBeCloseTo(60, 4);
    expect(body.bounds).toEqual([8.5, -2, -2.5, 11.5, 2, 2.5]);
  });

  it('is the rounded rectangle less the bore, as faceted, for the plate', () => {
    const { segmentsPerTurn, segmentsPerFillet } = QUALITY.export;
    const body = host.build(FIXTURES.plate!, QUALITY.export)[0]!;
    const corners = 4 * 9 - polygonArea(3, segmentsPerFillet * 4);
    expect(body.volume / ((800 - corners - polygonArea(4, segmentsPerTurn)) * 6)).toBeCloseTo(1, 6);
  });

  it('is the section turned round the axis, as faceted, for the ring', () => {
    const body = host.build(FIXTURES.ring!, QUALITY.preview)[0]!;
    const area = polygonArea(14, 32) - polygonArea(10, 32);
    expect(body.volume / (area * 5)).toBeCloseTo(1, 6);
  });

  it('keeps volume when a solid is moved and turned', () => {
    const still = build((kernel) => kernel.cylinder(5, 8, { topRadius: 3 }));
    const moved = build((kernel) =>
      kernel.place(
        kernel.place(kernel.cylinder(5, 8, { topRadius: 3 }), rotation('x', 0.7)),
        translation([9, -4, 2]),
      ),
    );
    expect(moved.volume / still.volume).toBeCloseTo(1, 6);
  });

  it('adds up: the union is the sum less the overlap', () => {
    let sum = 0;
    const body = build((kernel) => {
      const [a, b] = [kernel.box([10, 10, 10]), kernel.box([10, 10, 10], [5, 3, 2])];
      sum = kernel.volume(a) + kernel.volume(b) - kernel.volume(kernel.intersect([a, b]));
      return kernel.union([a, b]);
    });
    expect(body.volume / sum).toBeCloseTo(1, 6);
  });

  it('is zero for an empty intersection, which measures that two bodies are apart', () => {
    let overlap = Number.NaN;
    build((kernel) => {
      const [a, b] = [kernel.box([1, 1, 1]), kernel.box([1, 1, 1], [5, 0, 0])];
      overlap = kernel.volume(kernel.intersect([a, b]));
      return a;
    });
    expect(overlap).toBe(0);
  });
});

describe('what is refused', () => {
  const cases: Record<string, [(kernel: Kernel) => Solid, string]> = {
    'a clockwise first loop': [
      (kernel) => kernel.extrude({ loops: [[...square(5)].reverse()] }, 2),
      'extrude: the first loop runs clockwise',
    ],
    'a bow tie': [
      (kernel) =>
        kernel.extrude(
          {
            loops: [
              [
                [12, 10],
                [0, 10],
                [10, 0],
                [0, 0],
              ],
            ],
          },
          2,
        ),
      'extrude: a loop crosses or touches itself',
    ],
    'an outline that touches itself in a corner': [
      (kernel) =>
        kernel.extrude(
          {
            loops: [
              [
                [0, 0],
                [4, 0],
                [4, 4],
                [2, 0],
                [0, 4],
              ],
            ],
          },
          2,
        ),
      'extrude: a loop crosses or touches itself',
    ],
    'an outline that folds back on itself': [
      (kernel) =>
        kernel.extrude(
          {
            loops: [
              [
                [0, 0],
                [8, 0],
                [4, 0],
                [4, 4],
              ],
            ],
          },
          2,
        ),
      'extrude: a loop crosses or touches itself',
    ],
    'a hole that leaves its outline': [
      (kernel) => kernel.extrude({ loops: [square(5), [...square(5, [3, 3])].reverse()] }, 2),
      'extrude: two loops cross or touch',
    ],
    'a hole outside every outline': [
      (kernel) => kernel.extrude({ loops: [square(5), [...square(1, [8, 8])].reverse()] }, 2),
      'extrude: a hole lies outside every outline',
    ],
    'an outline inside another': [
      (kernel) => kernel.extrude({ loops: [square(5), square(1, [1, 1])] }, 2),
      'extrude: an outline lies inside another outline',
    ],
    'a loop with a point that is not a number': [
      (kernel) =>
        kernel.extrude(
          {
            loops: [
              [
                [0, 0],
                [Number.NaN, 0],
                [0, 1],
              ],
            ],
          },
          2,
        ),
      'extrude: a point is not a finite number',
    ],
    'a height of zero': [
      (kernel) => kernel.extrude({ loops: [square(5)] }, 0),
      'extrude: height must be a positive number of mm, not 0',
    ],
    'a negative box side': [
      (kernel) => kernel.box([1, -2, 3]),
      'box: y must be a positive number of mm, not -2',
    ],
    'a cylinder of no radius': [
      (kernel) => kernel.cylinder(0, 3),
      'cylinder: radius must be a positive number',
    ],
    'a section across the axis of its turn': [
      (kernel) => kernel.revolve({ loops: [square(5, [-1, 0])] }),
      'revolve: the profile crosses the axis',
    ],
    'a mesh turned inside out': [
      (kernel) => {
        const { positions, indices } = boxMesh([2, 2, 2]);
        return kernel.fromMesh({ positions, indices: indices.slice().reverse() });
      },
      'fromMesh: 1 flipped',
    ],
    'a mesh with a facet missing': [
      (kernel) => {
        const { positions, indices } = boxMesh([2, 2, 2]);
        return kernel.fromMesh({ positions, indices: indices.slice(3) });
      },
      'fromMesh: 3 open-edge',
    ],
    'a mirrored placement': [
      (kernel) => kernel.place(kernel.box([1, 1, 1]), [-1, 0, 0, 0, 0, 1, 0, 0, 0, 0, 1, 0, 0, 0, 0, 1]),
      'place: the placement is not a rotation and translation',
    ],
    'a cut that leaves nothing': [
      (kernel) => kernel.subtract(kernel.box([1, 1, 1]), [kernel.box([2, 2, 2])]),
      'subtract: nothing is left',
    ],
    'a union of no solids': [(kernel) => kernel.union([]), 'union: no solid given'],
    'an empty body': [
      (kernel) => kernel.intersect([kernel.box([1, 1, 1]), kernel.box([1, 1, 1], [4, 0, 0])]),
      'build: body is empty',
    ],
    'bodies that meet along one edge only': [
      (kernel) => kernel.union([kernel.box([2, 2, 2], [1, 1, 1]), kernel.box([2, 2, 2], [-1, -1, 1])]),
      'build: body is not a closed body: 1 overused-edge',
    ],
    'letters outside the printable characters': [
      (kernel) => kernel.extrude(kernel.outlines.text('Größe', { height: 5, stroke: 1 }), 1),
      'text: only plain printable characters can be drawn',
    ],
  };
  for (const [name, [make, message]] of Object.entries(cases)) {
    it(`refuses ${name}`, () => {
      const error = refusal(make);
      expect(error).toBeInstanceOf(KernelError);
      expect((error as KernelError).message).toContain(message);
    });
  }

  it('refuses a solid kept from an earlier build', () => {
    let kept: Solid | null = null;
    build((kernel) => {
      kept = kernel.box([1, 1, 1]);
      return kept;
    });
    expect(() => build((kernel) => kernel.union([kept!]))).toThrow(
      'union: the solid belongs to another build',
    );
  });

  it('refuses two bodies of one name', () => {
    expect(() =>
      host.build(
        (kernel) => [
          { name: 'a', solid: kernel.box([1, 1, 1]) },
          { name: 'a', solid: kernel.box([1, 1, 1]) },
        ],
        QUALITY.preview,
      ),
    ).toThrow('build: two bodies have one name');
  });
});
