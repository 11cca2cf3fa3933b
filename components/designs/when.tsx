/** A day, the same on server and screen. */
export const day = (iso: string): string =>
  new Date(iso).toLocaleDateString('en-GB', {
    day: 'numeric',
    month: 'short',
    year: 'numeric',
    timeZone: 'UTC',
  });

/** A moment, in universal time where the page is made. */
export const moment = (iso: string): string =>
  `${day(iso)}, ${new Date(iso).toLocaleTimeString('en-GB', { hour: '2-digit', minute: '2-digit', timeZone: 'UTC' })}`;

export const When = ({ iso }: { iso: string }) => (
  <time dateTime={iso} className="whitespace-nowrap">
    {day(iso)}
  </time>
);
