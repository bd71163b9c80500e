const months = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'] as const

const two = (value: number) => String(value).padStart(2, '0')

/** "3 Dec 2026": the month as a word, so that no country reads it as another day. */
export function dayWords(iso: string): string {
  const time = new Date(iso)
  return `${time.getUTCDate()} ${months[time.getUTCMonth()]} ${time.getUTCFullYear()}`
}

/** "3 Dec 2026, 10:42 UTC". In UTC and saying so: the server cannot know the zone of who reads it. */
export function timeWords(iso: string): string {
  const time = new Date(iso)
  return `${dayWords(iso)}, ${two(time.getUTCHours())}:${two(time.getUTCMinutes())} UTC`
}
