import Link from 'next/link';

export const BelowSignIn = ({ contact }: { contact: string | null }) => (
  <div className="flex flex-wrap justify-between gap-x-6 gap-y-2">
    <Link
      href="/forgot-password"
      className="inline-block min-h-6 underline underline-offset-4 hover:text-petrol"
    >
      Forgotten password?
    </Link>
    <span className="text-muted">
      No account? Members are invited by the club
      {contact && (
        <>
          :{' '}
          <a href={`mailto:${contact}`} className="break-all underline underline-offset-4">
            {contact}
          </a>
        </>
      )}
      .
    </span>
  </div>
);
