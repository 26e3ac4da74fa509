/** An instant as the farm's clock shows it, in words. Never the browser's zone, nor the server's. */
const WEEKDAYS = ['Sunday', 'Monday', 'Tuesday', 'Wednesday', 'Thursday', 'Friday', 'Saturday']
const MONTHS = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec']

export interface LocalTime { year: number, month: number, day: number, hour: number, minute: number, weekday: string }

const clocks = new Map<string, Intl.DateTimeFormat>()

function clockOf(zone: string): Intl.DateTimeFormat {
  let clock = clocks.get(zone)
  if (!clock) {
    clock = new Intl.DateTimeFormat('en-US', { timeZone: zone, hourCycle: 'h23', year: 'numeric', month: 'numeric', day: 'numeric', hour: 'numeric', minute: 'numeric' })
    clocks.set(zone, clock)
  }
  return clock
}

export function localTime(instant: string, zone: string): LocalTime {
  const parts = Object.fromEntries(clockOf(zone).formatToParts(new Date(instant)).map(part => [part.type, Number(part.value)]))
  const { year, month, day, hour, minute } = parts as unknown as Omit<LocalTime, 'weekday'>
  return { year, month, day, hour, minute, weekday: WEEKDAYS[new Date(Date.UTC(year, month - 1, day)).getUTCDay()]! }
}

/** '3 pm', '10:30 am', 'noon', 'midnight'. */
export function sayClock(instant: string, zone: string): string {
  const { hour, minute } = localTime(instant, zone)
  if (minute === 0 && hour === 12) return 'noon'
  if (minute === 0 && hour === 0) return 'midnight'
  return `${hour % 12 || 12}${minute ? `:${String(minute).padStart(2, '0')}` : ''} ${hour < 12 ? 'am' : 'pm'}`
}

/** 'Thursday 3 pm'; at midnight 'Thursday/Friday midnight', since people differ on whose midnight it is. */
export function sayDayClock(instant: string, zone: string): string {
  return withDay(instant, zone, weekday => weekday)
}

/** 'Thu 3 pm', 'Thu/Fri midnight'. */
export function sayShortDayClock(instant: string, zone: string): string {
  return withDay(instant, zone, weekday => weekday.slice(0, 3))
}

function withDay(instant: string, zone: string, name: (weekday: string) => string): string {
  const { weekday, hour, minute } = localTime(instant, zone)
  const before = WEEKDAYS[(WEEKDAYS.indexOf(weekday) + 6) % 7]!
  return `${hour === 0 && minute === 0 ? `${name(before)}/` : ''}${name(weekday)} ${sayClock(instant, zone)}`
}

/** 'Tue 6'. */
export function sayDay(instant: string, zone: string): string {
  const { weekday, day } = localTime(instant, zone)
  return `${weekday.slice(0, 3)} ${day}`
}

/** 'Tue 6 May, 5:00 am'. */
export function sayNow(instant: string, zone: string): string {
  const { weekday, day, month, hour, minute } = localTime(instant, zone)
  return `${weekday.slice(0, 3)} ${day} ${MONTHS[month - 1]}, ${hour % 12 || 12}:${String(minute).padStart(2, '0')} ${hour < 12 ? 'am' : 'pm'}`
}

export function hoursBetween(from: string, to: string): number {
  return (Date.parse(to) - Date.parse(from)) / 3_600_000
}

/** How old something is, in words. */
export function sayAge(from: string, now: string): string {
  const minutes = Math.max(0, Math.round(hoursBetween(from, now) * 60))
  if (minutes < 1) return 'just now'
  if (minutes < 60) return `${minutes} min ago`
  const hours = Math.floor(minutes / 60)
  return hours < 48 ? `${hours} h ${minutes % 60} min ago` : `${Math.floor(hours / 24)} days ago`
}
