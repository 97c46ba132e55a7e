const words = new Intl.DateTimeFormat('en-US', {
  weekday: 'long',
  day: 'numeric',
  month: 'long',
  year: 'numeric',
  timeZone: 'UTC',
});

/** "Friday 26 February 2027" of "2027-02-26". */
export function dayInWords(day: string): string {
  const parts = new Map(
    words.formatToParts(new Date(`${day}T00:00:00Z`)).map(({ type, value }) => [type, value]),
  );
  return `${parts.get('weekday')} ${parts.get('day')} ${parts.get('month')} ${parts.get('year')}`;
}

/** The calendar day of a moment, where the workshop is: "28 January 2027". */
export function momentInWords(moment: Date, timeZone: string): string {
  const day = new Intl.DateTimeFormat('en-US', { day: 'numeric', month: 'long', year: 'numeric', timeZone });
  const parts = new Map(day.formatToParts(moment).map(({ type, value }) => [type, value]));
  return `${parts.get('day')} ${parts.get('month')} ${parts.get('year')}`;
}
