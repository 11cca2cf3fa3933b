import { describe, expect, it } from 'vitest';
import { describePicture } from '@/components/viewport/describe';
import { paintPicture } from '@/components/viewport/drawing/painter';
import { frameOf, parallel, viewNamed } from '@/components/viewport/drawing/views';
import { arrange } from '@/components/viewport/mesh/arrange';
import { footprint } from '@/components/viewport/mesh/footprint';
import { peakOf, prepare } from '@/components/viewport/mesh/prepare';
import { layerStepFor } from '@/components/viewport/use-arrangement';
import type { Motion } from '@/generators/contract';
import { translation } from '@/lib/geometry/placement';
import { boxMesh } from './shapes';

const box = {
  name: 'box',
  mesh: boxMesh(10, 6, 4),
  volume: 240,
  bounds: [0, 0, 0, 10, 6, 4] as const,
};
const stretch: Motion = {
  label: 'Stretch',
  from: 'at rest',
  to: 'pulled',
  peakStrain: 0.1,
  pose(_, rest, t, out) {
    for (let k = 0; k < rest.length; k += 3) {
      out.positions.set([rest[k]! * (1 + 0.1 * t), rest[k + 1]!, rest[k + 2]!], k);
      out.strain[k / 3] = rest[k]! > 5 ? 0.1 * t : -0.02 * t;
    }
  },
};
const SIZE = { width: 400, height: 300 };
const frame = frameOf(viewNamed('corner'));
const project = parallel(frame, [5, 3, 2], 20, SIZE);
const yellow = [1, 0.8, 0.2] as const;

describe('the flat picture', () => {
  it('paints the three sides that are seen and their nine edges', () => {
    const moved = arrange([prepare(box, null)], null, 0);
    const strokes = paintPicture(
      [{ moved: moved[0]!, colour: yellow, seeThrough: false }],
      frame,
      project,
      null,
    );
    const count = (kind: string) =>
      strokes
        .filter((stroke) => stroke.kind === kind)
        .map(({ path }) => path.split('M').length - 1)
        .reduce((sum, one) => sum + one, 0);
    expect(count('face')).toBe(6);
    expect(count('crease')).toBe(9);
  });

  it('paints the far body before the near one', () => {
    const bodies = [prepare(box, null), prepare({ ...box, name: 'near' }, null)];
    const moved = arrange(bodies, null, 0, { near: translation([0, -20, 0]) });
    const strokes = paintPicture(
      moved.map((one, k) => ({ moved: one, colour: k === 0 ? yellow : [0, 0, 1], seeThrough: false })),
      frame,
      project,
      null,
    );
    const order = strokes.flatMap(({ kind, fill }) =>
      kind === 'face' ? [/rgb\(0 0 \d+\)/.test(fill) ? 'near' : 'far'] : [],
    );
    expect(order.indexOf('near')).toBeGreaterThan(order.lastIndexOf('far'));
  });

  it('shows only the edges, all of them, of a body that is seen through', () => {
    const moved = arrange([prepare(box, null)], null, 0);
    const strokes = paintPicture(
      [{ moved: moved[0]!, colour: yellow, seeThrough: true }],
      frame,
      project,
      null,
    );
    expect(strokes.map(({ kind }) => kind)).toEqual(['crease']);
    expect(strokes[0]!.path.split('M').length - 1).toBe(12);
  });
});

describe('posing', () => {
  it('leaves the part at rest without a motion', () => {
    const [moved] = arrange([prepare(box, null)], null, 1);
    expect([...moved!.positions]).toEqual([...box.mesh.positions]);
    expect(peakOf([moved!])).toBeNull();
  });

  it('finds the largest strain with its sign', () => {
    const [moved] = arrange([prepare(box, stretch)], stretch, 0.5);
    const peak = peakOf([moved!])!;
    expect(peak.strain).toBeCloseTo(0.05);
    expect(peak.vertices.length).toBeGreaterThan(3);
    for (const vertex of peak.vertices) expect(moved!.positions[3 * vertex]).toBeGreaterThan(5);
  });
});

describe('the shadow', () => {
  it('is darkest under the part and gone at the border', () => {
    const { size, shade } = footprint([box.mesh], { min: [0, 0, 0], max: [10, 6, 4] });
    expect(shade[(size / 2) * size + size / 2]).toBeGreaterThan(200);
    expect(Math.max(...shade.subarray(0, size))).toBe(0);
  });

  it('is fainter under a part held higher', () => {
    const raised = { ...box.mesh, positions: box.mesh.positions.map((v, k) => (k % 3 === 2 ? v + 8 : v)) };
    const middle = ({ size, shade }: ReturnType<typeof footprint>) => shade[(size / 2) * size + size / 2]!;
    const floor = { min: [0, 0, 0], max: [10, 6, 12] } as const;
    expect(middle(footprint([raised], floor))).toBeLessThan(middle(footprint([box.mesh], floor)) / 2);
  });
});

describe('words for the picture', () => {
  const bodies = [{ name: 'hook', triangles: 12, volume: 240, size: [10, 6, 4] as const }];
  const base = { bodies, moment: null, peak: null, allowable: null, onBed: false, cut: false };

  it('tell bodies with size and volume', () => {
    expect(describePicture(base)).toBe('One body: hook, 10 by 6 by 4 mm, volume 240\u202fmm³.');
  });

  it('tell the largest strain, whether it pulls or squeezes, and what is allowed', () => {
    const words = describePicture({
      ...base,
      moment: { label: 'Flex', share: 0.5 },
      peak: { strain: -0.0122, body: 0, vertices: [0] },
      allowable: 0.018,
    });
    expect(words).toContain('Flex 50 % of the way.');
    expect(words).toContain('Largest strain 1.2\u202f% in compression; allowable 1.8\u202f%.');
  });

  it('say that the place of largest strain is cut away, for then nothing marks it', () => {
    const peak = { strain: 0.01, body: 0, vertices: [0] };
    expect(describePicture({ ...base, peak, cut: true, peakCutAway: true })).toContain(
      'The place of largest strain is cut away, so it is not marked.',
    );
    expect(describePicture({ ...base, peak, cut: true })).not.toContain('cut away');
  });

  it('say that the allowable strain is not known rather than nothing', () => {
    const words = describePicture({ ...base, peak: { strain: 0.01, body: 0, vertices: [0] } });
    expect(words).toContain('allowable not known');
  });
});

describe('layer lines', () => {
  it('are close enough to show the direction and far enough apart to be seen', () => {
    expect(layerStepFor(2)).toBe(0.2);
    expect(layerStepFor(24)).toBe(1);
    expect(layerStepFor(120)).toBe(5);
    expect(layerStepFor(1000)).toBe(20);
  });
});
