/** Now, as records write it: ISO 8601 to the second, with the offset of the place. */
export function timestamp(now = new Date()): string {
  const minutes = -now.getTimezoneOffset();
  const two = (value: number): string => String(Math.floor(Math.abs(value))).padStart(2, '0');
  const local = new Date(now.getTime() + minutes * 60_000).toISOString().slice(0, 19);
  return `${local}${minutes < 0 ? '-' : '+'}${two(minutes / 60)}:${two(minutes % 60)}`;
}
