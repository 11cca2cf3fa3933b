import { parentPort } from 'node:worker_threads';
import { buildPartOnBed } from '@/generators/build-part';
import { familyEntry } from '@/generators/index';
import { NotFound } from '@/lib/errors';
import { writePartFile } from '@/lib/export/part-file';
import { createKernelHost } from '@/lib/geometry/host';
import type { ExportedPart, ExportRequest, FromExporter, PackedError, ToExporter } from './export.types';

const host = createKernelHost();

async function exportPart(request: ExportRequest): Promise<ExportedPart> {
  const entry = familyEntry(request.family);
  if (!entry) throw new NotFound(`family ${request.family}`);
  const [kernel, family] = await Promise.all([host, entry.load()]);
  const bodies = buildPartOnBed(kernel, family, request);
  const { format, title, materialName } = request;
  const bytes = writePartFile({ bodies, format, title, material: materialName });
  return {
    bytes,
    bodies: bodies.map(({ name, mesh, volume }) => ({ name, triangles: mesh.indices.length / 3, volume })),
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
