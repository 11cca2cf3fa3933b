import { CircleCheck, OctagonAlert } from 'lucide-react';
import { classNames } from '@/components/ui/class-names';
import type { FormState } from '@/lib/forms/state';

const LOOK = {
  done: { Icon: CircleCheck, class: 'border-ok bg-ok-soft text-ok' },
  refused: { Icon: OctagonAlert, class: 'border-over bg-over-soft text-over' },
} as const;

function noticeOf({ notice, errors }: FormState): FormState['notice'] {
  const form = errors.form;
  return notice ?? (form === undefined ? null : { kind: 'refused', text: form });
}

export function FormNotice({ state }: { state: FormState }) {
  const notice = noticeOf(state);
  const look = notice && LOOK[notice.kind];
  return (
    <div aria-live="polite" className="contents">
      {notice && look && (
        <p
          data-notice
          tabIndex={-1}
          className={classNames('flex items-start gap-2.5 rounded-field border px-3 py-2.5', look.class)}
        >
          <look.Icon aria-hidden="true" size={20} className="mt-0.5 shrink-0" />
          <span>{notice.text}</span>
        </p>
      )}
    </div>
  );
}
