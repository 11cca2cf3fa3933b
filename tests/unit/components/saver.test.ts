import { describe, expect, it } from 'vitest';
import type { Sent } from '@/components/forms/send';
import { createSaver, type Saving } from '@/components/studio/keep/saver';
import type { Design } from '@/generators/url-state';

const part = (length: number): Design => ({
  values: { length },
  material: 'pp',
  use: { opening: 'often', layers: 'along', temperature: 23 },
});

/** A server with one design, changed elsewhere when `elsewhere` is called. */
function server() {
  const stored = { revision: 1, changedAt: 'start', length: 1 };
  let reachable = true;
  const told: Saving['status'][] = [];
  const saves: { revision: number; apart: boolean }[] = [];
  const saver = createSaver(stored, {
    async save(revision, { values }, apart): Promise<Sent<typeof stored>> {
      saves.push({ revision, apart });
      if (!reachable) return { ok: false, status: 0, message: 'The server cannot be reached.' };
      if (revision !== stored.revision) return { ok: false, status: 409, message: 'Changed elsewhere.' };
      Object.assign(stored, { revision: revision + 1, length: values.length });
      return { ok: true, value: { ...stored } };
    },
    load: () => Promise.resolve({ ok: true, value: { ...stored } }),
    tell: ({ status }) => told.push(status),
  });
  return {
    stored,
    told,
    saves,
    saver,
    elsewhere: () => Object.assign(stored, { revision: stored.revision + 1, length: 50 }),
    cut: (whether: boolean) => {
      reachable = !whether;
    },
  };
}

describe('saving a design as it changes', () => {
  it('saves the latest of several changes, one save at a time', async () => {
    const { saver, stored, saves, told } = server();
    saver.note(part(2));
    const first = saver.flush();
    saver.note(part(3));
    saver.note(part(4));
    await first;
    await saver.flush();
    expect(stored).toMatchObject({ length: 4, revision: 3 });
    expect(saves.map(({ revision }) => revision)).toEqual([1, 2]);
    expect(told.at(-1)).toBe('saved');
    expect(saver.unsaved).toBe(false);
  });

  it('stops at a conflict and overwrites nothing until asked', async () => {
    const { saver, stored, elsewhere, told } = server();
    elsewhere();
    saver.note(part(2));
    await saver.flush();
    saver.note(part(3));
    await saver.flush();
    expect(told.at(-1)).toBe('conflict');
    expect(stored.length).toBe(50);
  });

  it('keeps mine over the other, which stays in the history', async () => {
    const { saver, stored, elsewhere, saves } = server();
    elsewhere();
    saver.note(part(2));
    await saver.flush();
    await saver.keepMine();
    expect(stored.length).toBe(2);
    expect(saves.at(-1)).toEqual({ revision: 2, apart: true });
  });

  it('takes the other and goes on from it', async () => {
    const { saver, stored, elsewhere } = server();
    elsewhere();
    saver.note(part(2));
    await saver.flush();
    expect(await saver.takeTheirs()).toMatchObject({ length: 50 });
    expect(saver.unsaved).toBe(false);
    saver.note(part(7));
    await saver.flush();
    expect(stored.length).toBe(7);
  });

  it('holds a change that could not be sent, and sends it when asked again', async () => {
    const { saver, stored, cut, told } = server();
    cut(true);
    saver.note(part(2));
    await saver.flush();
    expect(told.at(-1)).toBe('failed');
    cut(false);
    await saver.flush();
    expect(stored.length).toBe(2);
  });
});
