export { dayOf, shortDay }

const withYear = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'long', year: 'numeric', timeZone: 'UTC' })
const withoutYear = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'long', timeZone: 'UTC' })

/** An ISO 8601 instant as a day in words: “2 March 2026”; day and month stay together at the end of a line. */
function dayOf(iso: string): string {
  return withYear.format(new Date(iso)).replace(' ', '\u00A0')
}

/** The same without its year, for lists of what happened lately. */
function shortDay(iso: string): string {
  return withoutYear.format(new Date(iso)).replace(' ', '\u00A0')
}
