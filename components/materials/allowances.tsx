import { allowableStrain, serviceLimit } from '@/lib/materials/allowable';
import { DEFAULT_USE, type LayerDirection, type Material, type Opening } from '@/lib/materials/types';
import { formatQuantity } from '@/lib/units';

const OPENINGS: readonly (readonly [Opening, string])[] = [
  ['once', 'Opened once'],
  ['sometimes', 'sometimes'],
  ['often', 'often'],
];
const LAYERS: readonly (readonly [LayerDirection, string])[] = [
  ['along', 'Layers along the strain'],
  ['across', 'Layers pulled apart'],
];

function heatSentence(material: Material): string {
  const limit = serviceLimit(material);
  return limit === null
    ? 'How warm it may get in use is not known; the figures stand at room temperature.'
    : `These stand up to ${limit} °C.${limit > 40 ? ' Over 40 °C a part that is held strained creeps: they are for a short flex.' : ''}`;
}

/** The strain the check allows, by use. */
export function Allowances({ material }: { material: Material }) {
  const rows = material.process === 'printed' ? LAYERS : LAYERS.slice(0, 1);
  const allowed = (opening: Opening, layers: LayerDirection) =>
    formatQuantity(allowableStrain(material, { ...DEFAULT_USE, opening, layers }).value, 'strain', 2);
  return (
    <>
      <table className="mt-3 w-full text-left">
        <caption className="sr-only">Allowable strain at room temperature</caption>
        <thead className="text-muted text-sm">
          <tr>
            <td />
            {OPENINGS.map(([opening, words]) => (
              <th key={opening} scope="col" className="py-1 pr-3 font-normal">
                {words}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map(([layers, words]) => (
            <tr key={layers} className="border-hair border-t">
              <th scope="row" className="max-w-28 py-2 pr-3 font-normal text-sm leading-tight sm:max-w-40">
                {material.process === 'printed' ? words : 'Any direction'}
              </th>
              {OPENINGS.map(([opening]) => (
                <td
                  key={opening}
                  className="py-2 pr-3 whitespace-nowrap font-bold font-heading text-xl sm:text-3xl"
                >
                  {allowed(opening, layers)}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
      <p className="mt-2 max-w-prose text-muted text-sm">{heatSentence(material)}</p>
    </>
  );
}
