const day = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'short', year: 'numeric' });
const time = new Intl.DateTimeFormat('en-GB', { hour: '2-digit', minute: '2-digit' });
const zone = new Intl.DateTimeFormat('en-GB', { dateStyle: 'full', timeStyle: 'long' });

/** Point in time in the zone of the reader: day and time; the zone on hovering. */
export function Timestamp({ at, dayOnly = false }: { at: string; dayOnly?: boolean }) {
  const date = new Date(at);
  return (
    <time dateTime={at} title={zone.format(date)} className="whitespace-nowrap">
      {day.format(date)}
      {dayOnly ? null : <span className="text-ink-soft"> {time.format(date)}</span>}
    </time>
  );
}
