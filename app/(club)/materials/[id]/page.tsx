import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { connection } from 'next/server';
import { MaterialSheet } from '@/components/materials/material-sheet';
import { FAMILIES } from '@/generators';
import { listMaterials } from '@/lib/access/materials';

interface Props {
  readonly params: Promise<{ id: string }>;
}

async function materialOf({ params }: Props) {
  await connection();
  const { id } = await params;
  return listMaterials().find((material) => material.id === id) ?? notFound();
}

export async function generateMetadata(props: Props): Promise<Metadata> {
  const { shortName, summary } = await materialOf(props);
  return { title: shortName, description: summary };
}

export default async function MaterialPage(props: Props) {
  return <MaterialSheet material={await materialOf(props)} families={FAMILIES.map(({ about }) => about)} />;
}
