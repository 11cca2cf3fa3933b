import type { Metadata } from 'next';
import { connection } from 'next/server';
import { MaterialList } from '@/components/materials/material-list';
import { listMaterials } from '@/lib/access/materials';

export const metadata: Metadata = {
  title: 'Materials',
  description: 'How far each plastic may bend, how stiff it is and how warm it may get, with sources.',
};

export default async function MaterialsPage() {
  await connection();
  const materials = listMaterials();
  const made = (process: 'printed' | 'moulded') => materials.filter((one) => one.process === process);
  return (
    <main className="frame pt-8 pb-16">
      <h1 className="max-w-2xl font-bold text-4xl tracking-tight sm:text-5xl">How far may it bend?</h1>
      <p className="mt-3 max-w-prose text-lg text-muted">
        Strain each plastic may see, flat in its layers and at room temperature. Open a plastic for every
        figure, its range and where it comes from.
      </p>
      <h2 className="mt-10 font-bold text-2xl">Printed</h2>
      <MaterialList materials={made('printed')} full={0.04} />
      <h2 className="mt-10 font-bold text-2xl">Moulded, to compare</h2>
      <p className="mt-1 max-w-prose text-muted">
        What resin makers publish for moulded parts. A print of the same plastic takes a third to a half of
        it.
      </p>
      <MaterialList materials={made('moulded')} full={0.08} />
    </main>
  );
}
