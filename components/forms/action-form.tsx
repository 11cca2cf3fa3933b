'use client';

import { createContext, type ReactNode, useActionState, useContext, useEffect, useRef } from 'react';
import { classNames } from '@/components/ui/class-names';
import type { FormAction, FormState } from '@/lib/forms/state';
import { FormNotice } from './form-notice';

const EMPTY: FormState = { errors: {}, notice: null, values: {}, sent: 0 };

const Context = createContext<{ state: FormState; pending: boolean }>({ state: EMPTY, pending: false });

export const useForm = () => useContext(Context);

/** A form sent to a server action; it tells what is wrong with each field and leads to the first of them. */
export function ActionForm({
  action,
  children,
  className,
  label,
}: {
  action: FormAction;
  children: ReactNode;
  className?: string;
  label?: string;
}) {
  const [state, send, pending] = useActionState(action, EMPTY);
  const form = useRef<HTMLFormElement>(null);
  useEffect(() => {
    if (state.sent === 0) return;
    const fault = form.current?.querySelector<HTMLElement>('[aria-invalid="true"]');
    (fault ?? form.current?.querySelector<HTMLElement>('[data-notice]'))?.focus();
  }, [state]);
  return (
    <Context value={{ state, pending }}>
      <form
        ref={form}
        action={send}
        noValidate
        aria-label={label}
        className={classNames('grid gap-5', className)}
      >
        <FormNotice state={state} />
        {children}
      </form>
    </Context>
  );
}
