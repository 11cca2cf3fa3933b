import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { KeepNew } from '@/components/studio/keep/keep-new';
import { Studio } from '@/components/studio/studio';
import { familyEntry } from '@/generators';
import { listMaterials } from '@/lib/access/materials';
import { currentViewer } from '@/lib/auth/session';
import { type PageWords, queryOf } from '@/lib/http/page-words';

interface Props {
  readonly params: Promise<{ family: string }>;
  readonly searchParams: Promise<PageWords>;
}

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const entry = familyEntry((await params).family);
  return entry ? { title: entry.about.name, description: entry.about.summary } : { title: 'Not found' };
}

export default async function DesignPage({ params, searchParams }: Props) {
  const { family } = await params;
  if (!familyEntry(family)) notFound();
  const signedIn = (await currentViewer()) !== null;
  return (
    <Studio
      key={family}
      family={family}
      materials={listMaterials()}
      query={queryOf(await searchParams)}
      keep={<KeepNew signedIn={signedIn} startedFrom={null} />}
    />
  );
}
