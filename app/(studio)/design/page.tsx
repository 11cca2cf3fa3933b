import type { Metadata } from 'next';
import { FamilyList } from '@/components/studio/family-list';
import { FAMILIES } from '@/generators';

export const metadata: Metadata = {
  title: 'Choose a part',
  description: 'Straps, clips, caps and hinges to print: what each is for, when it is right and when not.',
};

export default function FamiliesPage() {
  return (
    <main className="frame pt-8 pb-16">
      <h1 className="max-w-2xl font-bold text-4xl tracking-tight sm:text-5xl">What must it hold?</h1>
      <p className="mt-3 max-w-prose text-lg text-muted">
        Choose by what the part does. Every one opens with a design that works; change it to fit yours.
      </p>
      <FamilyList families={FAMILIES.map(({ about }) => about)} />
    </main>
  );
}
