export { dayAndTime }

const format = new Intl.DateTimeFormat('en-GB', { dateStyle: 'medium', timeStyle: 'short', timeZone: 'UTC' })

/** A moment as people read it, such as “3 May 2026, 14:20 UTC”: these pages do not know the reader's time zone. */
function dayAndTime(iso: string): string {
  return `${format.format(new Date(iso))} UTC`
}
