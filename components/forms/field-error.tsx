import { TriangleAlert } from 'lucide-react';

export function FieldError({ id, children }: { id: string; children: string | undefined }) {
  if (!children) return null;
  return (
    <p id={id} className="flex items-start gap-1.5 text-over text-sm">
      <TriangleAlert aria-hidden="true" size={16} className="mt-0.5 shrink-0" />
      {children}
    </p>
  );
}
