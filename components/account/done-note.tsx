import { CircleCheck } from 'lucide-react';

const TEXTS: Readonly<Record<string, string>> = {
  reset: 'Your password is set. Sign in with it.',
  confirmed: 'The address is confirmed. Sign in with it.',
  deleted: 'Your account is deleted.',
};

/** Tells what was done on the page before. */
export function DoneNote({ done }: { done: string | undefined }) {
  const text = done === undefined ? undefined : TEXTS[done];
  if (!text) return null;
  return (
    <p
      role="status"
      className="mb-4 flex items-start gap-2.5 rounded-field border border-ok bg-ok-soft px-3 py-2.5 text-ok"
    >
      <CircleCheck aria-hidden="true" size={20} className="mt-0.5 shrink-0" />
      {text}
    </p>
  );
}
