const FORM = new Intl.DateTimeFormat('en-GB', {
  day: 'numeric',
  month: 'short',
  year: 'numeric',
  hour: '2-digit',
  minute: '2-digit',
  timeZone: 'UTC',
});

/** A moment given as ISO 8601, in universal time. */
export const Moment = ({ at }: { at: string }) => (
  <time dateTime={at} className="whitespace-nowrap tabular-nums">
    {FORM.format(new Date(at))} UTC
  </time>
);
