import { describe, expect, it } from 'vitest';
import { type Mesh, meshArea, meshProfile } from '@/lib/fea/mesh/mesh';
import { RECOMMENDED_MESH } from '@/lib/fea/mesh/options';
import { smallestAngle } from '@/lib/fea/mesh/quality';
import { outline } from '@/lib/fea/profile/outline';
import { type Profile, profileArea } from '@/lib/fea/profile/profile';
import { arc } from '@/lib/fea/profile/segment';

const plate: Profile = {
  loops: [
    outline([
      { at: [0, 0], tag: 'low' },
      { at: [20, 0], tag: 'right' },
      { at: [20, 8], radius: 2, tag: 'high' },
      { at: [0, 8], tag: 'left' },
    ]),
    [arc([7, 4], 1.5, 0, -2 * Math.PI, 'hole')],
  ],
};

function meshOf(profile: Profile): Mesh {
  const meshed = meshProfile(profile, RECOMMENDED_MESH);
  if (!meshed.ok) throw new Error(meshed.reason);
  return meshed.mesh;
}

/** How often each directed edge between corner nodes occurs. */
function directedEdges(mesh: Mesh): Map<string, number> {
  const seen = new Map<string, number>();
  for (let e = 0; e < mesh.elementCount; e++) {
    const corners = [...mesh.elements.subarray(6 * e, 6 * e + 3)];
    corners.forEach((from, k) => {
      const key = `${from}-${corners[(k + 1) % 3]}`;
      seen.set(key, (seen.get(key) ?? 0) + 1);
    });
  }
  return seen;
}

describe('mesh of a plate with a hole and a rounded corner', () => {
  const mesh = meshOf(plate);

  it('covers the area of the profile', () => {
    expect(Math.abs(meshArea(mesh) / profileArea(plate) - 1)).toBeLessThan(1e-6);
  });

  it('has no thin elements', () => {
    expect((smallestAngle(mesh) * 180) / Math.PI).toBeGreaterThan(20);
  });

  it('joins elements edge to edge, the boundary edges being those without a neighbour', () => {
    const edges = directedEdges(mesh);
    expect([...edges.values()].every((times) => times === 1)).toBe(true);
    const alone = [...edges.keys()].filter((key) => !edges.has(key.split('-').reverse().join('-')));
    const boundary = Array.from({ length: mesh.edgeCount }, (_, e) => {
      return `${mesh.edges[4 * e]}-${mesh.edges[4 * e + 2]}`;
    });
    expect(new Set(alone)).toEqual(new Set(boundary));
  });

  it('satisfies Euler: corners - edges + elements = 1 - holes', () => {
    const sides = (3 * mesh.elementCount + mesh.edgeCount) / 2;
    expect(mesh.cornerCount - sides + mesh.elementCount).toBe(0);
    expect(mesh.nodeCount).toBe(mesh.cornerCount + sides);
  });

  it('puts every node of the hole on the circle', () => {
    for (let e = 0; e < mesh.edgeCount; e++) {
      if (mesh.tags[mesh.edges[4 * e + 3]!] !== 'hole') continue;
      for (let k = 0; k < 3; k++) {
        const node = mesh.edges[4 * e + k]!;
        const radius = Math.hypot(mesh.nodes[2 * node]! - 7, mesh.nodes[2 * node + 1]! - 4);
        expect(radius).toBeCloseTo(1.5, 12);
      }
    }
  });

  it('is the same to the byte when made again', () => {
    const again = meshOf(plate);
    expect(again.nodes).toEqual(mesh.nodes);
    expect(again.elements).toEqual(mesh.elements);
    expect(again.edges).toEqual(mesh.edges);
  });
});

describe('meshing', () => {
  it('gives the fault of the profile as the reason', () => {
    const open = { loops: [plate.loops[0]!.slice(1)] };
    expect(meshProfile(open, RECOMMENDED_MESH)).toEqual({
      ok: false,
      reason: expect.stringContaining('open') as string,
    });
  });

  it('refuses a shape that needs more elements than the cap', () => {
    const meshed = meshProfile(plate, { ...RECOMMENDED_MESH, longest: 0.02 });
    expect(meshed).toEqual({ ok: false, reason: 'the shape needs more elements than the limit' });
  });

  it('follows a slot much narrower than the elements around it', () => {
    const slotted: Profile = {
      loops: [
        outline([
          { at: [0, 0], tag: 'low' },
          { at: [30, 0], tag: 'right' },
          { at: [30, 20], tag: 'high' },
          { at: [15.05, 20], tag: 'slot' },
          { at: [15.05, 5], tag: 'slot' },
          { at: [15, 5], tag: 'slot' },
          { at: [15, 20], tag: 'high' },
          { at: [0, 20], tag: 'left' },
        ]),
      ],
    };
    const mesh = meshOf(slotted);
    expect(Math.abs(meshArea(mesh) / profileArea(slotted) - 1)).toBeLessThan(1e-9);
    expect((smallestAngle(mesh) * 180) / Math.PI).toBeGreaterThan(12);
  });
});
