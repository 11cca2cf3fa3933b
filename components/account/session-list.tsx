import { ActionForm } from '@/components/forms/action-form';
import { SubmitButton } from '@/components/forms/submit-button';
import { Moment } from '@/components/ui/moment';
import { Sheet, SheetTitle } from '@/components/ui/sheet';
import type { OwnSession } from '@/lib/access/account';
import type { FormAction } from '@/lib/forms/state';
import { deviceOf } from './device';

function SessionRow({ session, here, end }: { session: OwnSession; here: boolean; end: FormAction }) {
  const device = deviceOf(session.userAgent);
  return (
    <li className="flex flex-wrap items-center justify-between gap-x-6 gap-y-2 py-3">
      <div>
        <p className="font-semibold">
          {device}
          {here && <span className="marked ml-2 font-bold">this one</span>}
        </p>
        <p className="text-muted text-sm">
          since <Moment at={session.since} /> · last used <Moment at={session.seen} />
        </p>
      </div>
      {!here && (
        <ActionForm action={end}>
          <input type="hidden" name="id" value={session.id} />
          <SubmitButton look="line" small>
            End it
            <span className="sr-only">
              : {device}, since <Moment at={session.since} />
            </span>
          </SubmitButton>
        </ActionForm>
      )}
    </li>
  );
}

export function SessionList({
  sessions,
  present,
  end,
  endOthers,
}: {
  sessions: readonly OwnSession[];
  present: string | null;
  end: FormAction;
  endOthers: FormAction;
}) {
  return (
    <Sheet labelledBy="sign-ins" className="p-5">
      <SheetTitle
        id="sign-ins"
        aside={
          <span className="text-muted text-sm">ends after 14 days without use, at the latest after 90</span>
        }
      >
        Where you are signed in
      </SheetTitle>
      <ul className="mt-2 divide-y divide-hair">
        {sessions.map((session) => (
          <SessionRow key={session.id} session={session} here={session.id === present} end={end} />
        ))}
      </ul>
      {sessions.length > 1 && (
        <ActionForm action={endOthers} label="End all others" className="mt-3">
          <div>
            <SubmitButton look="line">End all others</SubmitButton>
          </div>
        </ActionForm>
      )}
    </Sheet>
  );
}
