'use client';

import { fieldId } from './field-row';

/** Leads to a field without leaving a trace in the history of the browser. */
export function ToField({ name }: { name: string }) {
  return (
    <button
      type="button"
      className="min-h-6 font-semibold underline underline-offset-4"
      onClick={() => document.getElementById(fieldId(name))?.focus()}
    >
      to the field
    </button>
  );
}
