import type { Metadata } from 'next';
import { KeepSaved } from '@/components/studio/keep/keep-saved';
import { Studio } from '@/components/studio/studio';
import { designLink } from '@/lib/access/design-link';
import { getDesign } from '@/lib/access/designs';
import { listMaterials } from '@/lib/access/materials';
import { readPage } from '@/lib/http/page';

export const metadata: Metadata = { title: 'Design' };

export default async function KeptDesignPage({ params }: { params: Promise<{ id: string }> }) {
  const { id } = await params;
  const design = await readPage(`/designs/${id}`, (viewer) => getDesign(viewer, id));
  return (
    <Studio
      key={id}
      family={design.family}
      materials={listMaterials()}
      query={await designLink(design)}
      title={design.name}
      local={false}
      keep={<KeepSaved kept={design} />}
    />
  );
}
