import { parentPort } from 'node:worker_threads';
import { familyEntry } from '@/generators/index';
import { drawPart } from '@/generators/picture';
import { NotFound } from '@/lib/errors';
import { createKernelHost } from '@/lib/geometry/host';
import type { PackedError } from './export.types';
import type { FromPainter, PartPicture, PictureRequest, ToPainter } from './picture.types';

const host = createKernelHost();

async function paint({ family: id, parameters, width, height }: PictureRequest): Promise<PartPicture> {
  const entry = familyEntry(id);
  if (!entry) throw new NotFound(`family ${id}`);
  const [kernel, family] = await Promise.all([host, entry.load()]);
  return drawPart(kernel, family, { parameters, size: { width, height } });
}

function pack(error: unknown): PackedError {
  if (!(error instanceof Error)) return { name: 'Error', message: String(error) };
  return { ...error, name: error.name, message: error.message };
}

async function answer({ job, request }: ToPainter): Promise<FromPainter> {
  try {
    return { job, picture: await paint(request) };
  } catch (error) {
    return { job, error: pack(error) };
  }
}

const port = parentPort;
port?.on('message', async (message: ToPainter) => {
  const reply = await answer(message);
  port.postMessage(reply, 'picture' in reply ? [reply.picture.pixels.buffer] : []);
});
