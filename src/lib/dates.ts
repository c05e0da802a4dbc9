const moment = new Intl.DateTimeFormat(undefined, { dateStyle: 'medium', timeStyle: 'short' })
const day = new Intl.DateTimeFormat(undefined, { dateStyle: 'medium' })

/** A moment in the reader's own zone. */
export const momentText = (iso: string): string => moment.format(new Date(iso))
export const dayText = (iso: string): string => day.format(new Date(iso.length === 10 ? `${iso}T12:00:00` : iso))

/** Today where the reader is, YYYY-MM-DD. */
export function today(): string {
  const now = new Date()
  const two = (value: number): string => String(value).padStart(2, '0')
  return `${String(now.getFullYear())}-${two(now.getMonth() + 1)}-${two(now.getDate())}`
}
