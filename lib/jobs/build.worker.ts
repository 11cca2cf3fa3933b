import { parentPort } from 'node:worker_threads';
import { buildPartOnBed } from '@/generators/build-part';
import { familyEntry } from '@/generators/index';
import { NotFound, TooLarge } from '@/lib/errors';
import { writeStl } from '@/lib/export/stl';
import { writeThreeMf } from '@/lib/export/three-mf';
import { createKernelHost } from '@/lib/geometry/host';
import type { BuiltBody } from '@/lib/geometry/kernel';
import type { ExportedPart, ExportRequest, FromExporter, PackedError, ToExporter } from './export.types';

/** 25 MB as STL: far more than any part of the families, far less than the server can hold. */
const TRIANGLE_LIMIT = 500_000;
const BYTE_LIMIT = 32_000_000;

const host = createKernelHost();

const trianglesOf = ({ mesh }: BuiltBody): number => mesh.indices.length / 3;

function write(bodies: readonly BuiltBody[], { format, title, materialName }: ExportRequest) {
  if (format === '3mf') return writeThreeMf({ title, material: materialName, bodies });
  const header = `Bendwell, mm: ${title}`;
  return writeStl(
    bodies.map((body) => body.mesh),
    header,
  );
}

async function exportPart(request: ExportRequest): Promise<ExportedPart> {
  const entry = familyEntry(request.family);
  if (!entry) throw new NotFound(`family ${request.family}`);
  const [kernel, family] = await Promise.all([host, entry.load()]);
  const bodies = buildPartOnBed(kernel, family, request);
  const triangles = bodies.reduce((sum, body) => sum + trianglesOf(body), 0);
  if (triangles > TRIANGLE_LIMIT) {
    throw new TooLarge(`The part has ${triangles} triangles; a file may have at most ${TRIANGLE_LIMIT}`);
  }
  const bytes = write(bodies, request);
  if (bytes.length > BYTE_LIMIT) {
    throw new TooLarge(`The file has ${bytes.length} bytes; at most ${BYTE_LIMIT} are allowed`);
  }
  return {
    bytes,
    bodies: bodies.map((body) => ({ name: body.name, triangles: trianglesOf(body), volume: body.volume })),
  };
}

function pack(error: unknown): PackedError {
  if (!(error instanceof Error)) return { name: 'Error', message: String(error) };
  return { ...error, name: error.name, message: error.message };
}

async function answer({ job, request }: ToExporter): Promise<FromExporter> {
  try {
    return { job, part: await exportPart(request) };
  } catch (error) {
    return { job, error: pack(error) };
  }
}

const port = parentPort;
port?.on('message', async (message: ToExporter) => {
  const reply = await answer(message);
  port.postMessage(reply, 'part' in reply ? [reply.part.bytes.buffer] : []);
});
