import type { ReactNode } from 'react';
import { Sheet } from '@/components/ui/sheet';

/** A page with one form, such as the sign-in. */
export function AccountSheet({
  title,
  lead,
  children,
  below,
}: {
  title: string;
  lead?: ReactNode;
  children: ReactNode;
  below?: ReactNode;
}) {
  return (
    <main className="frame grid flex-1 content-start justify-items-center py-10 sm:py-16">
      <div className="grid w-full max-w-md gap-5">
        <h1 className="font-bold text-4xl tracking-tight">{title}</h1>
        {lead && <div className="text-muted">{lead}</div>}
        <Sheet className="p-5 sm:p-7">{children}</Sheet>
        {below && <div className="text-sm">{below}</div>}
      </div>
    </main>
  );
}
