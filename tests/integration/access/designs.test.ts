import { afterEach, describe, expect, it, vi } from 'vitest';
import {
  copyDesign,
  createDesign,
  deleteDesign,
  getDesign,
  listDesigns,
  listStates,
  renameDesign,
  restoreState,
  saveDesign,
  undeleteDesign,
} from '@/lib/access/designs';
import type { Member } from '@/lib/access/policy';
import { Conflict, InvalidInput, NotAllowed, NotFound, SignInNeeded } from '@/lib/errors';
import { seededDatabase } from '../../support/database';
import { memberOf } from '../../support/viewers';

const db = seededDatabase();
const ines = memberOf(db, 'Ines Moor');
const tom = memberOf(db, 'Tom Reed');
const librarian = memberOf(db, 'Ada Lind', 'librarian');
const admin = memberOf(db, 'Ruth Vane', 'admin');

const HINGE = { family: 'living-hinge', material: 'pp' } as const;
const hinge = (viewer: Member, name = 'Receiver box lid') => createDesign(viewer, { ...HINGE, name });

afterEach(() => vi.useRealTimers());

describe('kept designs', () => {
  it('gives a kept design back with every parameter and a verdict of our own', async () => {
    const kept = await createDesign(ines, { ...HINGE, name: 'Lid', parameters: { webLength: 4 } });
    const { parameters, verdict, revision } = getDesign(ines, kept.id);
    expect(parameters).toMatchObject({ webLength: 4, leafWidth: expect.any(Number) });
    expect(verdict).toMatch(/limit|known/);
    expect(revision).toBe(1);
  });

  it('keeps nothing for a visitor, nor for an account without the role', async () => {
    await expect(createDesign(null, { ...HINGE, name: 'Lid' })).rejects.toThrow(SignInNeeded);
    expect(() => listDesigns(null)).toThrow(SignInNeeded);
    await expect(hinge({ ...tom, roles: [] })).rejects.toThrow(NotAllowed);
  });

  it.each([
    ['another member', tom],
    ['the librarian', librarian],
    ['the admin', admin],
  ])('is not found by %s, in any way', async (_, other) => {
    const { id } = await hinge(ines);
    const change = { ...HINGE, revision: 1 };
    expect(() => getDesign(other, id)).toThrow(NotFound);
    await expect(saveDesign(other, id, change)).rejects.toThrow(NotFound);
    expect(() => renameDesign(other, id, 'Mine')).toThrow(NotFound);
    expect(() => copyDesign(other, id)).toThrow(NotFound);
    expect(() => listStates(other, id)).toThrow(NotFound);
    await expect(restoreState(other, id, { state: 1, revision: 1 })).rejects.toThrow(NotFound);
    expect(() => deleteDesign(other, id)).toThrow(NotFound);
    expect(() => undeleteDesign(other, id)).toThrow(NotFound);
    expect(listDesigns(other).designs.map((one) => one.id)).not.toContain(id);
    expect(getDesign(ines, id).name).toBe('Receiver box lid');
  });

  it('refuses the save of a second tab and keeps what the first one saved', async () => {
    const { id } = await hinge(ines);
    await saveDesign(ines, id, { ...HINGE, revision: 1, parameters: { webLength: 4 } });
    const late = saveDesign(ines, id, { ...HINGE, revision: 1, parameters: { webLength: 6 } });
    await expect(late).rejects.toThrow(Conflict);
    expect(getDesign(ines, id)).toMatchObject({ revision: 2, parameters: { webLength: 4 } });
  });

  it('refuses a design outside its bounds, in an unknown plastic or as another kind of part', async () => {
    const wide = createDesign(ines, { ...HINGE, name: 'Lid', parameters: { webLength: 1e6 } });
    await expect(wide).rejects.toThrow(/Web length must be at most/);
    await expect(createDesign(ines, { ...HINGE, name: 'Lid', material: 'wood' })).rejects.toThrow(NotFound);
    const { id } = await hinge(ines);
    const other = saveDesign(ines, id, { family: 'rod-clip', material: 'pp', revision: 1 });
    await expect(other).rejects.toThrow(InvalidInput);
  });

  it('brings a deleted design back, and not after its time', async () => {
    const { id } = await hinge(ines);
    const { id: second } = await hinge(ines);
    deleteDesign(ines, id);
    expect(() => getDesign(ines, id)).toThrow(NotFound);
    expect(listDesigns(ines, { deleted: true }).designs.map((one) => one.id)).toContain(id);
    expect(undeleteDesign(ines, id).id).toBe(id);
    deleteDesign(ines, id);
    vi.useFakeTimers({ now: Date.now() + 31 * 24 * 3_600_000, toFake: ['Date'] });
    deleteDesign(ines, second);
    expect(() => undeleteDesign(ines, id)).toThrow(NotFound);
  });

  it('copies a design as one of its own', async () => {
    const { id } = await hinge(ines, 'Hatch');
    const copy = copyDesign(ines, id);
    expect(copy).toMatchObject({ name: 'Copy of Hatch', revision: 1 });
    await saveDesign(ines, copy.id, { ...HINGE, revision: 1, parameters: { webLength: 5 } });
    expect(getDesign(ines, id).revision).toBe(1);
  });
});

describe('the history of a design', () => {
  const minutes = (count: number) =>
    vi.useFakeTimers({ now: Date.parse('2026-03-01T10:00:00Z') + count * 60_000, toFake: ['Date'] });

  it('holds the first state, and one for each run of saves', async () => {
    minutes(0);
    const { id } = await hinge(ines);
    const save = (revision: number, webLength: number) =>
      saveDesign(ines, id, { ...HINGE, revision, parameters: { webLength } });
    minutes(1);
    await save(1, 4);
    minutes(3);
    await save(2, 5);
    minutes(20);
    await save(3, 6);
    const states = listStates(ines, id);
    expect(states.map(({ revision }) => revision)).toEqual([4, 3, 1]);
    expect(states.map(({ parameters }) => parameters.webLength)).toEqual([6, 5, expect.any(Number)]);
  });

  it('restores an earlier state as the newest and loses none', async () => {
    minutes(0);
    const { id } = await hinge(ines);
    minutes(20);
    await saveDesign(ines, id, { ...HINGE, revision: 1, parameters: { webLength: 6 } });
    const before = getDesign(ines, id).parameters.webLength;
    minutes(21);
    const restored = await restoreState(ines, id, { state: 1, revision: 2 });
    expect(restored.revision).toBe(3);
    expect(restored.parameters.webLength).not.toBe(before);
    expect(listStates(ines, id).map(({ revision }) => revision)).toEqual([3, 2, 1]);
    await expect(restoreState(ines, id, { state: 2, revision: 2 })).rejects.toThrow(Conflict);
    await expect(restoreState(ines, id, { state: 9, revision: 3 })).rejects.toThrow(NotFound);
  });
});

describe('the list of designs', () => {
  const member = memberOf(db, 'Jo Falk');

  it('finds, filters, sorts and pages on the server', async () => {
    await createDesign(member, { family: 'rod-clip', material: 'petg', name: 'Mast clip 100%' });
    await createDesign(member, { family: 'living-hinge', material: 'pp', name: 'Hatch' });
    for (let at = 0; at < 20; at += 1) await hinge(member, `Lid ${at}`);
    expect(listDesigns(member)).toMatchObject({ total: 22, pages: 2, page: 1 });
    expect(listDesigns(member, { page: 2 }).designs).toHaveLength(2);
    expect(listDesigns(member, { search: 'mast' }).total).toBe(1);
    expect(listDesigns(member, { search: '100%' }).total).toBe(1);
    expect(listDesigns(member, { search: '%' }).total).toBe(1);
    expect(listDesigns(member, { search: '_' }).total).toBe(0);
    expect(listDesigns(member, { family: 'rod-clip' }).designs[0]?.name).toBe('Mast clip 100%');
    expect(listDesigns(member, { sort: 'name' }).designs[0]?.name).toBe('Hatch');
    expect(listDesigns(member, { sort: 'family', descending: true }).designs[0]?.family).toBe('rod-clip');
  });
});
