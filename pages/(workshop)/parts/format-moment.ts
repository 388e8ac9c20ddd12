export { dayOf, momentInWords, waitingSince }

const MONTHS = [
  'January', 'February', 'March', 'April', 'May', 'June', 'July', 'August', 'September', 'October', 'November', 'December',
]
const MINUTE = 60_000
const HOUR = 60 * MINUTE
const DAY = 24 * HOUR

/** The parts of a moment in one time zone: UTC on the server and while hydrating, the reader's own afterwards. */
interface Clock {
  year: number
  month: number
  day: number
  time: string
}

/** “14 March 2026” in UTC, the same on the server and in the browser. */
function dayOf(iso: string): string {
  const { day, month, year } = read(new Date(iso), 'utc')
  return `${day} ${MONTHS[month]} ${year}`
}

/**
 * A moment as people say it: “today at 08:12”, “14 March at 19:40”, with the year when it is not this one.
 * @param zone `utc` says so in the words, since nobody else counts in it
 */
function momentInWords(iso: string, now: Date, zone: 'utc' | 'local'): string {
  const then = read(new Date(iso), zone)
  const today = read(now, zone)
  const yesterday = read(new Date(now.getTime() - DAY), zone)
  const time = zone === 'utc' ? `${then.time} UTC` : then.time
  if (sameDay(then, today)) return `today at ${time}`
  if (sameDay(then, yesterday)) return `yesterday at ${time}`
  const year = then.year === today.year ? '' : ` ${then.year}`
  return `${then.day} ${MONTHS[then.month]}${year} at ${time}`
}

/** How long something has been waiting: “2 days”, “3 hours”, “less than an hour”. */
function waitingSince(iso: string, now: Date): string {
  const waited = Math.max(0, now.getTime() - new Date(iso).getTime())
  const counted = (count: number, unit: string) => `${count} ${unit}${count === 1 ? '' : 's'}`
  if (waited >= 2 * DAY) return counted(Math.floor(waited / DAY), 'day')
  if (waited >= DAY) return '1 day'
  return waited >= HOUR ? counted(Math.floor(waited / HOUR), 'hour') : 'less than an hour'
}

function read(date: Date, zone: 'utc' | 'local'): Clock {
  const [year, month, day, hours, minutes] =
    zone === 'utc'
      ? [date.getUTCFullYear(), date.getUTCMonth(), date.getUTCDate(), date.getUTCHours(), date.getUTCMinutes()]
      : [date.getFullYear(), date.getMonth(), date.getDate(), date.getHours(), date.getMinutes()]
  const two = (part: number) => String(part).padStart(2, '0')
  return { year, month, day, time: `${two(hours)}:${two(minutes)}` }
}

function sameDay(one: Clock, other: Clock): boolean {
  return one.year === other.year && one.month === other.month && one.day === other.day
}
