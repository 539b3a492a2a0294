const two = (value: number): string => String(Math.trunc(Math.abs(value))).padStart(2, '0');

/** A moment as TOML and so the settings block has it, to the second, in local time with its distance from UTC: 2031-04-02T09:31:00+02:00. */
export function offsetTime(moment: Date): string {
  const ahead = -moment.getTimezoneOffset();
  const local = new Date(moment.getTime() + ahead * 60_000).toISOString().slice(0, 19);
  return `${local}${ahead < 0 ? '-' : '+'}${two(ahead / 60)}:${two(ahead % 60)}`;
}
