/** "at 14:02", or "on 2031-05-04 at 14:02" where that was another day. */
export function momentWords(at: string, now: Date = new Date()): string {
  const then = new Date(at);
  const two = (n: number): string => String(n).padStart(2, '0');
  const clock = `${two(then.getHours())}:${two(then.getMinutes())}`;
  if (then.toDateString() === now.toDateString()) return `at ${clock}`;
  const day = `${then.getFullYear()}-${two(then.getMonth() + 1)}-${two(then.getDate())}`;
  return `on ${day} at ${clock}`;
}
