const FORMAT = new Intl.DateTimeFormat('en-GB', { dateStyle: 'medium', timeStyle: 'short', timeZone: 'UTC' });
const DAY = new Intl.DateTimeFormat('en-GB', { dateStyle: 'medium', timeZone: 'UTC' });

/** A moment in UTC, so that server and browser write the same. */
export function Time({ iso, day = false }: { readonly iso: string; readonly day?: boolean }) {
  const date = new Date(iso);
  return (
    <time dateTime={iso} className="whitespace-nowrap">
      {day ? DAY.format(date) : `${FORMAT.format(date)} UTC`}
    </time>
  );
}
