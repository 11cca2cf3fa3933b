import { partSvg } from '@/components/site/part-svg';
import { FAMILIES, familyEntry } from '@/generators';

export const dynamic = 'force-static';
export const dynamicParams = false;

export const generateStaticParams = () => FAMILIES.map(({ about }) => ({ family: about.id }));

export async function GET(_request: Request, { params }: { params: Promise<{ family: string }> }) {
  const entry = familyEntry((await params).family);
  if (!entry) return new Response(null, { status: 404 });
  return new Response(await partSvg(await entry.load()), {
    headers: { 'content-type': 'image/svg+xml; charset=utf-8' },
  });
}
