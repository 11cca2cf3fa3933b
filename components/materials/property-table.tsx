import { SourceText } from '@/components/studio/source-note';
import type { PropertyGroup, QuantityKey } from '@/lib/materials/properties';
import type { Material } from '@/lib/materials/types';
import { whyMissing, written } from './figures';

function Row({ material, name, label }: { material: Material; name: QuantityKey; label: string }) {
  const quantity = material[name];
  const figure = written(name, quantity);
  return (
    <tr className="border-hair border-t align-top max-sm:grid max-sm:py-2">
      <th scope="row" className="py-2 pr-4 text-left font-semibold max-sm:py-0">
        {label}
      </th>
      <td className="whitespace-nowrap py-2 pr-4 max-sm:py-0">
        {figure ? (
          <>
            <b className="font-mono font-semibold">{figure.value}</b>
            {figure.range && <span className="block text-muted text-sm">{figure.range}</span>}
          </>
        ) : (
          <span className="text-unknown">not known</span>
        )}
      </td>
      <td className="py-2 text-sm max-sm:py-0">
        {quantity ? (
          <SourceText source={quantity.source} />
        ) : (
          <p className="first-letter:uppercase">{whyMissing(material, name)}.</p>
        )}
      </td>
    </tr>
  );
}

/** One group of properties: value, range, where it comes from and how well that is known. */
export function PropertyTable({ material, group }: { material: Material; group: PropertyGroup }) {
  return (
    <table className="mt-3 w-full max-sm:block [&_tbody]:max-sm:block">
      <caption className="sr-only">
        {group.label} of {material.name}
      </caption>
      <colgroup>
        <col className="w-[16rem]" />
        <col className="w-[15rem]" />
        <col />
      </colgroup>
      <thead className="text-left text-muted text-sm max-sm:sr-only">
        <tr>
          <th scope="col" className="py-1 font-normal">
            Figure
          </th>
          <th scope="col" className="py-1 font-normal">
            Value and range
          </th>
          <th scope="col" className="py-1 font-normal">
            Source, and how well it is known
          </th>
        </tr>
      </thead>
      <tbody>
        {group.properties.map(({ key, label }) => (
          <Row key={key} material={material} name={key} label={label} />
        ))}
      </tbody>
    </table>
  );
}
