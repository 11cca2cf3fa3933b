import type { ReactNode } from 'react';

export function AdminHead({ title, lead, children }: { title: string; lead?: string; children?: ReactNode }) {
  return (
    <div className="mb-5 flex flex-wrap items-end justify-between gap-4">
      <div>
        <h1 className="font-bold text-4xl tracking-tight">{title}</h1>
        {lead && <p className="mt-1 text-muted">{lead}</p>}
      </div>
      {children}
    </div>
  );
}
