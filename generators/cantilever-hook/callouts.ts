import type { Vec3 } from '@/lib/geometry/kernel';
import type { Callout } from '../contract';
import { noseEnd } from './dimensions';
import type { HookValues } from './schema';

type Line = Pick<Callout, 'from' | 'to' | 'offset'> & { readonly field: keyof HookValues };

const lengthOf = (v: HookValues, { field, ...line }: Line): Callout => ({
  ...line,
  field,
  kind: 'length',
  value: v[field] as number,
  unit: 'mm',
});

export function callouts(v: HookValues): readonly Callout[] {
  const half = v.rootWidth / 2;
  const back = -v.rootThickness;
  const gap = Math.max(3, 0.2 * v.armLength);
  const crest: Vec3 = [v.undercut, -half, v.armLength];
  const lines: Line[] = [
    { field: 'armLength', from: [back, -half, 0], to: [back, -half, v.armLength], offset: [-gap, 0, 0] },
    { field: 'undercut', from: [0, -half, v.armLength], to: crest, offset: [0, 0, gap] },
    {
      field: 'landLength',
      from: crest,
      to: [v.undercut, -half, v.armLength + v.landLength],
      offset: [gap, 0, 0],
    },
    {
      field: 'rootThickness',
      from: [back, -half, v.rootFillet],
      to: [0, -half, v.rootFillet],
      offset: [0, -gap, 0],
    },
    {
      field: 'tipThickness',
      from: [-v.tipThickness, -half, noseEnd(v)],
      to: [0, -half, noseEnd(v)],
      offset: [0, 0, gap / 2],
    },
    { field: 'rootWidth', from: [back, -half, 0], to: [back, half, 0], offset: [-gap / 2, 0, 0] },
  ];
  const fillet: Callout = {
    field: 'rootFillet',
    kind: 'radius',
    from: [v.rootFillet, -half, v.rootFillet],
    to: [v.rootFillet * (1 - Math.SQRT1_2), -half, v.rootFillet * (1 - Math.SQRT1_2)],
    offset: [gap / 2, 0, gap / 4],
    value: v.rootFillet,
    unit: 'mm',
  };
  const lengths = lines.map((line) => lengthOf(v, line));
  return v.rootFillet > 0 ? [...lengths, fillet] : lengths;
}
