import 'server-only';
import { randomUUID } from 'node:crypto';
import { mkdir, readFile, rename, rm, writeFile } from 'node:fs/promises';
import path from 'node:path';
import { env } from '@/lib/env';

export type Shelf = 'pictures' | 'photos';

/** Names are made here and of nothing else, so that no name leads out of its folder. */
const OWN_NAME = /^[a-z0-9][a-z0-9-]{7,79}\.webp$/;

function placeOf(shelf: Shelf, name: string): string {
  if (!OWN_NAME.test(name)) throw new RangeError('a stored file has a name of our own making');
  return path.resolve(env().FILES_PATH, shelf, name.slice(0, 2), name);
}

/** The file's bytes, or null where there is none. */
export async function readStored(shelf: Shelf, name: string): Promise<Uint8Array<ArrayBuffer> | null> {
  try {
    return new Uint8Array(await readFile(placeOf(shelf, name)));
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code === 'ENOENT') return null;
    throw error;
  }
}

/** Writes beside the place and moves it there, so that nobody ever reads half a file. */
export async function store(shelf: Shelf, name: string, bytes: Uint8Array): Promise<void> {
  const place = placeOf(shelf, name);
  await mkdir(path.dirname(place), { recursive: true });
  const draft = `${place}.${randomUUID()}`;
  await writeFile(draft, bytes);
  await rename(draft, place);
}

export const removeStored = (shelf: Shelf, name: string): Promise<void> =>
  rm(placeOf(shelf, name), { force: true });
