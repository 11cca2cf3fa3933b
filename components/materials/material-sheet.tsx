import Link from 'next/link';
import { Sheet, SheetTitle } from '@/components/ui/sheet';
import type { About } from '@/generators/contract';
import { PROPERTY_GROUPS } from '@/lib/materials/properties';
import type { Material } from '@/lib/materials/types';
import { Allowances } from './allowances';
import { OtherFacts, PrintFacts } from './facts';
import { PropertyTable } from './property-table';

const PAD = 'px-5 py-4 sm:px-7';

function Designs({ material, families }: { material: Material; families: readonly About[] }) {
  return (
    <Sheet labelledBy="designs" className={PAD}>
      <SheetTitle id="designs">Design in {material.shortName}</SheetTitle>
      <ul className="mt-2 columns-2 gap-6">
        {families.map(({ id, name }) => (
          <li key={id}>
            <Link
              href={`/design/${id}?material=${material.id}`}
              className="inline-flex min-h-9 items-center underline decoration-edge underline-offset-4 hover:decoration-ink pointer-coarse:min-h-11"
            >
              {name}
            </Link>
          </li>
        ))}
      </ul>
    </Sheet>
  );
}

const CAUTIONS =
  'Estimates for a first print: makers, colours and printers differ, so prove a part by test. Whether it may touch food or drinking water depends on the exact resin, its additives, the nozzle and local rules. Keep the fumes of printing ventilated.';

/** Everything that is known of one plastic. */
export function MaterialSheet({ material, families }: { material: Material; families: readonly About[] }) {
  return (
    <main className="frame grid gap-5 pt-8 pb-16">
      <div>
        <Link
          href="/materials"
          className="inline-flex min-h-9 items-center text-muted text-sm underline underline-offset-4 hover:text-ink"
        >
          All materials
        </Link>
        <h1 className="mt-1 font-bold text-4xl tracking-tight sm:text-5xl">{material.name}</h1>
        <p className="mt-2 max-w-prose text-lg text-muted">{material.summary}</p>
      </div>
      <div className="grid gap-5 lg:grid-cols-[1.4fr_1fr]">
        <Sheet labelledBy="allowed" className={PAD}>
          <SheetTitle id="allowed">Allowable strain by use</SheetTitle>
          <Allowances material={material} />
        </Sheet>
        <Designs material={material} families={families} />
      </div>
      {PROPERTY_GROUPS.map((group) => (
        <Sheet key={group.id} labelledBy={group.id} className={PAD}>
          <SheetTitle id={group.id}>{group.label}</SheetTitle>
          <PropertyTable material={material} group={group} />
        </Sheet>
      ))}
      {material.print && (
        <Sheet labelledBy="print" className={PAD}>
          <SheetTitle id="print">Printing</SheetTitle>
          <PrintFacts print={material.print} />
        </Sheet>
      )}
      <Sheet labelledBy="life" className={PAD}>
        <SheetTitle id="life">In use</SheetTitle>
        <OtherFacts material={material} />
      </Sheet>
      <p className="max-w-prose text-muted text-sm">{CAUTIONS}</p>
    </main>
  );
}
