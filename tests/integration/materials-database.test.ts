import { describe, expect, it } from 'vitest';
import { findMaterial, listMaterials, putShippedMaterial, setMaterialPrice } from '@/db/queries/materials';
import { materials } from '@/db/schema/materials';
import { seedMaterials } from '@/db/seed/materials';
import { MATERIALS, materialById } from '@/lib/materials/data';
import { emptyDatabase } from '../support/database';

const seeded = () => {
  const db = emptyDatabase();
  seedMaterials(db);
  return db;
};
const clubPrice = {
  perKg: 19.5,
  currency: 'EUR',
  asOf: '2026-11-30',
  source: { text: 'Invoice of the club', mark: 'given' },
} as const;

describe('the plastics in the database', () => {
  it('come back as they were shipped, in order', () => {
    expect(listMaterials(seeded())).toEqual(MATERIALS);
  });

  it('are found by id', () => {
    const db = seeded();
    expect(findMaterial(db, 'pp')).toEqual(materialById('pp'));
    expect(findMaterial(db, 'unobtainium')).toBeUndefined();
  });

  it('stay the same when seeded again', () => {
    const db = seeded();
    seedMaterials(db);
    expect(listMaterials(db)).toEqual(MATERIALS);
  });

  it('keep a price the club has entered when seeded again', () => {
    const db = seeded();
    expect(setMaterialPrice(db, 'petg', clubPrice, new Date(0))).toBe(true);
    seedMaterials(db);
    expect(findMaterial(db, 'petg')?.price).toEqual(clubPrice);
    expect(findMaterial(db, 'pla')?.price).toEqual(materialById('pla')?.price);
  });

  it('keep a record the club has changed when seeded again, and correct one that it has not', () => {
    const db = seeded();
    const changed = { ...materialById('pla')!, summary: 'Changed by the club.' };
    putShippedMaterial(db, changed, 0);
    seedMaterials(db);
    expect(findMaterial(db, 'pla')?.summary).toBe(materialById('pla')?.summary);
    putShippedMaterial(db, changed, 0);
    db.update(materials)
      .set({ editedAt: new Date(0) })
      .run();
    seedMaterials(db);
    expect(findMaterial(db, 'pla')?.summary).toBe('Changed by the club.');
  });

  it('take no price for a plastic that is not there, and none that is not positive', () => {
    const db = seeded();
    expect(setMaterialPrice(db, 'unobtainium', clubPrice, new Date(0))).toBe(false);
    expect(() => setMaterialPrice(db, 'petg', { ...clubPrice, perKg: 0 }, new Date(0))).toThrow();
  });

  it('refuse a record whose value lies outside its own range', () => {
    const wrong = { ...materialById('pla')! };
    const allowableOnce = { ...wrong.allowableOnce!, low: 0.5 };
    expect(() => putShippedMaterial(emptyDatabase(), { ...wrong, allowableOnce }, 0)).toThrow(
      /outside its own range/,
    );
  });

  it('survive on disk under foreign keys, write-ahead logging and full synchronisation', () => {
    const pragma = (name: string) => seeded().$client.pragma(name, { simple: true });
    expect(pragma('foreign_keys')).toBe(1);
    expect(pragma('synchronous')).toBe(2);
    expect(pragma('busy_timeout')).toBe(5000);
  });
});
