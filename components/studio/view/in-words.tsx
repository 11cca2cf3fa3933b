import type { BodyFacts, ViewportState } from '@/components/viewport/types';
import type { Material } from '@/lib/materials/types';
import { formatQuantity } from '@/lib/units';

const sizeText = ({ size }: BodyFacts): string => `${size.map((one) => one.toFixed(1)).join(' × ')} mm`;

/** Volume in mm3 and density in g/cm3 to g, for a solid body. */
function massText(volume: number, material: Material): string {
  if (!material.density) return `mass not known, no density of ${material.shortName}`;
  return `${formatQuantity((volume / 1000) * material.density.value, 'g')} if solid in ${material.shortName}`;
}

const STILL: Readonly<Record<Exclude<ViewportState['status'], 'ready'>, string>> = {
  loading: 'The solid is being made.',
  failed: 'The solid could not be made.',
  'no-webgl': 'This browser draws no solids; the numbers beside stand all the same.',
};

/** The picture as text: bodies, sizes, volume, mass. */
export function InWords({ state, material }: { state: ViewportState; material: Material }) {
  const bodies = state.bodies ?? [];
  const volume = bodies.reduce((sum, body) => sum + body.volume, 0);
  return (
    <div className="border-hair border-t px-4 py-2.5 text-sm">
      <h3 className="sr-only">The part in words</h3>
      {bodies.length === 0 ? (
        <p className="text-muted">
          {state.status === 'ready' ? 'No bodies.' : STILL[state.status]} {state.message}
        </p>
      ) : (
        <ul className="flex flex-wrap gap-x-6 gap-y-0.5">
          {bodies.map((body) => (
            <li key={body.name}>
              <b className="font-semibold">{body.name}</b>{' '}
              <span className="font-mono text-muted">{sizeText(body)}</span>
            </li>
          ))}
          <li className="text-muted">
            {formatQuantity(volume, 'mm3')}, {massText(volume, material)}
          </li>
        </ul>
      )}
    </div>
  );
}
