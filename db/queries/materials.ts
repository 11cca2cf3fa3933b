import { asc, count, eq, isNull, sql } from 'drizzle-orm';
import { serviceLimit } from '@/lib/materials/allowable';
import { materialSchema, priceSchema } from '@/lib/materials/schema';
import type { Material, Price } from '@/lib/materials/types';
import type { Db } from '../client';
import { materialPrices, materials } from '../schema/materials';

const columns = {
  properties: materials.properties,
  perKg: materialPrices.perKg,
  currency: materialPrices.currency,
  asOf: materialPrices.asOf,
  source: materialPrices.source,
};

const select = (db: Db) =>
  db.select(columns).from(materials).leftJoin(materialPrices, eq(materialPrices.materialId, materials.id));

type Row = ReturnType<ReturnType<typeof select>['all']>[number];

function materialOf({ properties, perKg, currency, asOf, source }: Row): Material {
  const price = perKg === null ? null : { perKg, currency, asOf, source };
  return materialSchema.parse({ ...properties, price });
}

export const listMaterials = (db: Db): Material[] =>
  select(db).orderBy(asc(materials.position)).all().map(materialOf);

export const countMaterials = (db: Db): number =>
  db.select({ found: count() }).from(materials).get()?.found ?? 0;

export function findMaterial(db: Db, id: string): Material | undefined {
  const row = select(db).where(eq(materials.id, id)).get();
  return row && materialOf(row);
}

function rowOf(material: Material, position: number) {
  const { price: _, ...properties } = materialSchema.parse(material);
  return {
    id: material.id,
    position,
    process: material.process,
    name: material.name,
    allowableOnce: material.allowableOnce?.value ?? null,
    allowableOften: material.allowableOften?.value ?? null,
    modulus: (material.flexuralModulus ?? material.tensileModulus)?.value ?? null,
    serviceLimit: serviceLimit(material),
    properties,
  };
}

/** Writes a plastic as shipped, price included; records and prices the club has changed stay as they are. */
export function putShippedMaterial(db: Db, material: Material, position: number): void {
  const row = rowOf(material, position);
  db.insert(materials)
    .values(row)
    .onConflictDoUpdate({ target: materials.id, set: row, setWhere: isNull(materials.editedAt) })
    .run();
  if (!material.price) return;
  const price = { materialId: material.id, ...priceSchema.parse(material.price) };
  db.insert(materialPrices)
    .values(price)
    .onConflictDoUpdate({
      target: materialPrices.materialId,
      set: price,
      setWhere: isNull(materialPrices.editedAt),
    })
    .run();
}

/** Enters the club's own price; false when there is no such plastic. */
export function setMaterialPrice(db: Db, id: string, price: Price, editedAt: Date): boolean {
  const row = { materialId: id, ...priceSchema.parse(price), editedAt };
  const known = db.select({ one: sql`1` }).from(materials).where(eq(materials.id, id)).get();
  if (!known) return false;
  db.insert(materialPrices)
    .values(row)
    .onConflictDoUpdate({ target: materialPrices.materialId, set: row })
    .run();
  return true;
}
