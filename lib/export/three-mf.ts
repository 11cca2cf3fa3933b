import { strToU8, zipSync } from 'fflate';
import type { TriMesh } from '@/lib/geometry/kernel';

export interface ThreeMfPart {
  readonly title: string;
  /** name of the plastic, or null where none is chosen */
  readonly material: string | null;
  readonly bodies: readonly { readonly name: string; readonly mesh: TriMesh }[];
}

/** The earliest time a zip entry can carry; fixed, so that the same part gives the same bytes. */
const ENTRY_TIME = '1980-01-01T00:00:00';
const CORE = 'http://schemas.microsoft.com/3dmanufacturing/core/2015/02';
const NEUTRAL_GREY = '#8A9499';
const TEXT_LIMIT = 200;

const CONTENT_TYPES = `<?xml version="1.0" encoding="UTF-8"?>
<Types xmlns="http://schemas.openxmlformats.org/package/2006/content-types">
<Default Extension="rels" ContentType="application/vnd.openxmlformats-package.relationships+xml"/>
<Default Extension="model" ContentType="application/vnd.ms-package.3dmanufacturing-3dmodel+xml"/>
</Types>
`;

const RELATIONSHIPS = `<?xml version="1.0" encoding="UTF-8"?>
<Relationships xmlns="http://schemas.openxmlformats.org/package/2006/relationships">
<Relationship Target="/3D/3dmodel.model" Id="rel0" Type="http://schemas.microsoft.com/3dmanufacturing/2013/01/3dmodel"/>
</Relationships>
`;

const ENTITIES: Readonly<Record<string, string>> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&apos;',
};

/** Characters that XML 1.0 cannot hold at all: control characters, lone surrogates, U+FFFE and U+FFFF. */
const NOT_XML = /[^\t\n\r\u{20}-\u{D7FF}\u{E000}-\u{FFFD}\u{10000}-\u{10FFFF}]/gu;

function xmlText(text: string): string {
  const kept = [...text.replace(NOT_XML, '')].slice(0, TEXT_LIMIT).join('');
  return kept.replace(/[&<>"']/g, (character) => ENTITIES[character]!);
}

/** Nine significant digits tell any two float32 numbers apart. */
const coordinate = (value: number): string => String(Number(value.toPrecision(9)));

function meshXml({ positions, indices }: TriMesh): string {
  const lines = ['<mesh><vertices>'];
  for (let at = 0; at < positions.length; at += 3) {
    const [x, y, z] = [positions[at]!, positions[at + 1]!, positions[at + 2]!].map(coordinate);
    lines.push(`<vertex x="${x}" y="${y}" z="${z}"/>`);
  }
  lines.push('</vertices><triangles>');
  for (let at = 0; at < indices.length; at += 3) {
    lines.push(`<triangle v1="${indices[at]}" v2="${indices[at + 1]}" v3="${indices[at + 2]}"/>`);
  }
  lines.push('</triangles></mesh>');
  return lines.join('\n');
}

function modelXml({ title, material, bodies }: ThreeMfPart): string {
  const madeOf = material === null ? '' : ' pid="1" pindex="0"';
  const objects = bodies.map(
    ({ name, mesh }, at) =>
      `<object id="${at + 2}" type="model" name="${xmlText(name)}"${madeOf}>\n${meshXml(mesh)}\n</object>`,
  );
  const base = `<base name="${xmlText(material ?? '')}" displaycolor="${NEUTRAL_GREY}"/>`;
  return [
    '<?xml version="1.0" encoding="UTF-8"?>',
    `<model unit="millimeter" xml:lang="en" xmlns="${CORE}">`,
    `<metadata name="Title">${xmlText(title)}</metadata>`,
    ...(material === null ? [] : [`<metadata name="Description">Material: ${xmlText(material)}</metadata>`]),
    '<metadata name="Application">Bendwell</metadata>',
    '<resources>',
    ...(material === null ? [] : [`<basematerials id="1">${base}</basematerials>`]),
    ...objects,
    '</resources>',
    '<build>',
    ...bodies.map((_, at) => `<item objectid="${at + 2}"/>`),
    '</build>',
    '</model>',
    '',
  ].join('\n');
}

/**
 * 3MF (3D Manufacturing Format, core specification): a zip of the model and the two files that say where it is.
 * Unit millimetre, bodies as named objects with shared vertices, placed where they stand. Same part, same bytes.
 */
export function writeThreeMf(part: ThreeMfPart): Uint8Array<ArrayBuffer> {
  const entries = {
    '[Content_Types].xml': strToU8(CONTENT_TYPES),
    '_rels/.rels': strToU8(RELATIONSHIPS),
    '3D/3dmodel.model': strToU8(modelXml(part)),
  };
  return new Uint8Array(zipSync(entries, { level: 6, mtime: ENTRY_TIME }));
}
