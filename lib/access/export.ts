import 'server-only';
import { createHash } from 'node:crypto';
import type { Family } from '@/generators/contract';
import { type Entries, readEntries } from '@/generators/url-state';
import { InvalidInput } from '@/lib/errors';
import { exportFileName, type FileFormat } from '@/lib/export/file-name';
import { KernelError, type QualityName } from '@/lib/geometry/kernel';
import { exportPart, type ExportRequest as Job } from '@/lib/jobs/build-pool';
import { boundedIssues, loadFamily, readParameters } from './families';
import { getMaterial } from './materials';

/** What is wanted of a file, besides the part. */
export interface FileWish {
  readonly family: string;
  readonly format: FileFormat;
  readonly quality: QualityName;
  /** names of the bodies; all where left out */
  readonly bodies?: readonly string[] | undefined;
  /** id of the stance on the bed; the best where left out */
  readonly stance?: string | undefined;
  /** what the design is called; the family's name where left out */
  readonly name?: string | undefined;
}

export interface ExportRequest extends FileWish {
  readonly parameters?: Readonly<Record<string, unknown>> | undefined;
  /** id of the plastic, named in 3MF files */
  readonly material?: string | undefined;
}

export interface ExportedFile {
  readonly bytes: Uint8Array<ArrayBuffer>;
  readonly fileName: string;
  readonly mediaType: string;
  /** strong entity tag of the content, quotes included */
  readonly etag: string;
}

const MEDIA_TYPE: Readonly<Record<FileFormat, string>> = { stl: 'model/stl', '3mf': 'model/3mf' };

const entityTag = (bytes: Uint8Array): string =>
  `"${createHash('sha256').update(bytes).digest('base64url').slice(0, 32)}"`;

function checkStance(family: Family, parameters: unknown, stance: string | undefined): void {
  const ids = family.stances(parameters).map(({ id }) => id);
  if (stance !== undefined && !ids.includes(stance)) {
    throw new InvalidInput([{ field: 'stance', message: `stance must be one of ${ids.join(', ')}` }]);
  }
}

/** A shape that cannot be made is the input's fault: it tells which step failed and why. */
async function build(job: Job) {
  try {
    return await exportPart(job);
  } catch (error) {
    if (!(error instanceof KernelError)) throw error;
    const message = `The shape cannot be built: ${error.operation}, ${error.status}`;
    throw new InvalidInput([{ field: 'parameters', message }]);
  }
}

async function exportFamily(family: Family, request: ExportRequest): Promise<ExportedFile> {
  const { format, quality, bodies, stance, name, material } = request;
  const parameters = readParameters(family, request.parameters);
  checkStance(family, parameters, stance);
  const title = name ?? family.about.name;
  const materialName = material === undefined ? null : getMaterial(material).name;
  const job = { family: request.family, parameters, format, quality, bodies, stance, title, materialName };
  const { bytes } = await build(job);
  return {
    bytes,
    fileName: exportFileName(title, format),
    mediaType: MEDIA_TYPE[format],
    etag: entityTag(bytes),
  };
}

/** The file of a part: open to anyone, stores nothing. */
export async function exportDesign(request: ExportRequest): Promise<ExportedFile> {
  return exportFamily(await loadFamily(request.family), request);
}

/** The file of a part whose design is written as the words of a link. */
export async function exportLink(wish: FileWish, entries: Entries): Promise<ExportedFile> {
  const family = await loadFamily(wish.family);
  const read = readEntries(family, entries);
  if (!read.ok) throw new InvalidInput(boundedIssues(family, read.issues));
  const { values, material } = read.values;
  return exportFamily(family, { ...wish, parameters: values, material });
}
