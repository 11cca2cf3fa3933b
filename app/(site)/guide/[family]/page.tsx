import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { GuideArticle } from '@/components/site/guide-article';
import { FAMILIES, familyEntry } from '@/generators';

interface Props {
  readonly params: Promise<{ family: string }>;
}

export const dynamicParams = false;

export const generateStaticParams = () => FAMILIES.map(({ about }) => ({ family: about.id }));

export async function generateMetadata({ params }: Props): Promise<Metadata> {
  const about = familyEntry((await params).family)?.about;
  if (!about) return { title: 'Not found' };
  const title = `${about.name}: how it works`;
  const description = `${about.summary} How it fails, the formulas with their sources, how to print it.`;
  return { title, description, openGraph: { title, description, type: 'article', siteName: 'Bendwell' } };
}

export default async function GuidePage({ params }: Props) {
  const entry = familyEntry((await params).family);
  if (!entry) notFound();
  return <GuideArticle about={entry.about} guide={await entry.loadGuide()} />;
}
