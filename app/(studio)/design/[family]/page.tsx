import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { Studio } from '@/components/studio/studio';
import { familyEntry } from '@/generators';
import { listMaterials } from '@/lib/access/materials';

interface Props {
  readonly params: Promise<{ family: string }>;
  readonly searchParams: Promise<Record<string, string | string[] | undefined>>;
}

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const entry = familyEntry((await params).family);
  return entry ? { title: entry.about.name, description: entry.about.summary } : {};
}

function queryOf(given: Awaited<Props['searchParams']>): string {
  const pairs = Object.entries(given).flatMap(([key, value]) =>
    [value ?? []].flat().map((one) => [key, one]),
  );
  return pairs.map(([key, value]) => `${encodeURIComponent(key!)}=${encodeURIComponent(value!)}`).join('&');
}

export default async function DesignPage({ params, searchParams }: Props) {
  const { family } = await params;
  if (!familyEntry(family)) notFound();
  return (
    <Studio key={family} family={family} materials={listMaterials()} query={queryOf(await searchParams)} />
  );
}
