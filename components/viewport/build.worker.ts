import { buildPart, type PartRequest } from '@/generators/build-part';
import type { Family } from '@/generators/contract';
import { familyEntry } from '@/generators/index';
import { InvalidInput, NotFound } from '@/lib/errors';
import { createKernelHost } from '@/lib/geometry/host';
import { type BuiltBody, KernelError } from '@/lib/geometry/kernel';

export interface BuildRequest extends PartRequest {
  readonly family: string;
}

export type ToWorker =
  | { readonly kind: 'warm-up'; readonly family?: string | undefined }
  | { readonly kind: 'build'; readonly job: number; readonly request: BuildRequest };

export type FromWorker =
  | { readonly kind: 'built'; readonly job: number; readonly bodies: readonly BuiltBody[] }
  | { readonly kind: 'failed'; readonly job: number; readonly because: string };

/** Loads once; a load that failed, as on a lost connection, is tried again the next time. */
function once<T>(load: () => Promise<T>): () => Promise<T> {
  let loaded: Promise<T> | null = null;
  return () => {
    loaded ??= load().catch((error: unknown) => {
      loaded = null;
      throw error;
    });
    return loaded;
  };
}

const kernelHost = once(createKernelHost);

async function loadFamily(id: string): Promise<Family> {
  const entry = familyEntry(id);
  if (!entry) throw new NotFound(`family ${id}`);
  return entry.load();
}

function because(error: unknown): string {
  if (error instanceof InvalidInput) return error.issues.map((issue) => `${issue.message}.`).join(' ');
  if (error instanceof NotFound) return `${error.message}.`;
  if (error instanceof KernelError) return `These dimensions do not make a closed solid (${error.message}).`;
  return `The part could not be built (${error instanceof Error ? error.message : String(error)}).`;
}

function answer(message: FromWorker): void {
  const transfer =
    message.kind === 'built'
      ? message.bodies.flatMap(({ mesh }) => [mesh.positions.buffer, mesh.indices.buffer])
      : [];
  self.postMessage(message, { transfer: transfer as ArrayBuffer[] });
}

async function build(job: number, request: BuildRequest): Promise<void> {
  try {
    const [ready, family] = await Promise.all([kernelHost(), loadFamily(request.family)]);
    answer({ kind: 'built', job, bodies: buildPart(ready, family, request) });
  } catch (error) {
    answer({ kind: 'failed', job, because: because(error) });
  }
}

async function warmUp(family: string | undefined): Promise<void> {
  await Promise.allSettled([kernelHost(), family === undefined ? null : loadFamily(family)]);
}

self.addEventListener('message', (event: MessageEvent<ToWorker>) => {
  const message = event.data;
  if (message.kind === 'build') void build(message.job, message.request);
  else void warmUp(message.family);
});
