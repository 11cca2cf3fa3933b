import { RequestProblem } from './problem';

const JSON_TYPE = /^application\/json\s*(;|$)/i;

function refuse(limit: number): never {
  throw new RequestProblem('too-large', `The body may be at most ${limit} bytes.`);
}

/** The body's bytes, read no further than the limit whatever Content-Length says. */
export async function readBytes(request: Request, limit: number): Promise<Uint8Array> {
  if (Number(request.headers.get('content-length') ?? 0) > limit) refuse(limit);
  const chunks: Uint8Array[] = [];
  let size = 0;
  for await (const chunk of (request.body ?? []) as AsyncIterable<Uint8Array>) {
    size += chunk.byteLength;
    if (size > limit) refuse(limit);
    chunks.push(chunk);
  }
  return Buffer.concat(chunks);
}

export async function readJson(request: Request, limit: number): Promise<unknown> {
  if (!JSON_TYPE.test(request.headers.get('content-type') ?? '')) {
    throw new RequestProblem('unsupported-media-type', 'Send the body as application/json.');
  }
  const bytes = await readBytes(request, limit);
  try {
    return JSON.parse(new TextDecoder('utf-8', { fatal: true }).decode(bytes));
  } catch {
    throw new RequestProblem('malformed-json', 'The body could not be read as JSON in UTF-8.');
  }
}
