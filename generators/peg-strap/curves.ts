import { wedgeFactor } from '@/lib/mechanics/friction';
import { wrapStrain } from '@/lib/mechanics/strap';
import { radians } from '@/lib/units';
import type { Curve } from '../report';
import { HEAD_RIM, returnLength, stripLayout } from './layout';
import { bundleAt } from './mechanics';
import type { Subject } from './subject';

type Point = readonly [number, number];

/** Force along the peg while the eye slides down the back face: it pushes itself home where friction allows. */
const homing = (mu: number, angle: number): number => {
  if (angle >= 90) return 0;
  const slope = Math.tan(radians(angle));
  return (mu - slope) / (1 + mu * slope);
};

/** Push over travel from first touch: lead-in, rim, back face. */
function pushPoints({ values, radial }: Subject, mu: number): Point[] {
  const growth = (values.headDiameter - values.eyeDiameter) / 2;
  const lead = growth / Math.tan(radians(values.headLeadAngle));
  const rim = lead + HEAD_RIM;
  const share = (2 * growth) / (values.headDiameter - values.pegDiameter);
  const home = rim + returnLength(values) * share;
  const force = radial!.strip;
  const back = force * homing(mu, values.headReturnAngle);
  const points: Point[] = [
    [0, 0],
    [lead, force * wedgeFactor(mu, values.headLeadAngle)],
    [lead, force * mu],
    [rim, force * mu],
    [rim, back],
    [home, 0],
  ];
  return points;
}

/** Push-in force over travel with the friction band; none where the lead-in locks. */
function pushCurve(subject: Subject): Curve[] {
  const { friction } = subject.material;
  if (!subject.push || !Number.isFinite(subject.push.high)) return [];
  const low = pushPoints(subject, friction.low);
  const high = pushPoints(subject, friction.high);
  return [
    {
      id: 'push-in',
      label: 'Push-in force over travel',
      x: { label: 'Travel of the eye over the head', unit: 'mm' },
      y: { label: 'Push', unit: 'N' },
      points: pushPoints(subject, friction.value),
      band: low.map(([, force], at) => [force, high[at]![1]] as const),
    },
  ];
}

/** Strain of the plain strip on the bundle of each eye. Only a straight strap lies on its bundle. */
function wrapCurve({ values }: Subject): Curve[] {
  const { eyes } = stripLayout(values);
  if (eyes.length < 2 || values.halfTurn) return [];
  return [
    {
      id: 'wrap-by-bundle',
      label: 'Wrap strain by bundle, one point an eye',
      x: { label: 'Bundle diameter', unit: 'mm' },
      y: { label: 'Wrap strain', unit: 'strain' },
      points: eyes.map((loop): Point => {
        const bundle = bundleAt(values, loop);
        return [bundle, wrapStrain(values.strapThickness, bundle)];
      }),
    },
  ];
}

export const curves = (subject: Subject): Curve[] => [...pushCurve(subject), ...wrapCurve(subject)];
