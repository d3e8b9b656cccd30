const months = ['Jan', 'Feb', 'Mar', 'Apr', 'May', 'Jun', 'Jul', 'Aug', 'Sep', 'Oct', 'Nov', 'Dec'] as const;
const two = (number: number) => String(number).padStart(2, '0');

/** The moment on the wall clock of this device: `today 14:02`, else `27 Mar 2028, 14:02`; the text itself if it is no date. */
export function savedWhen(iso: string, now: Date): string {
  const date = new Date(iso);
  if (Number.isNaN(date.getTime())) return iso;
  const clock = `${two(date.getHours())}:${two(date.getMinutes())}`;
  if (date.toDateString() === now.toDateString()) return `today ${clock}`;
  return `${date.getDate()} ${months[date.getMonth()]} ${date.getFullYear()}, ${clock}`;
}
