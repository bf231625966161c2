/** "14 Nov 2026", in the person's own time zone. */
export function formatDay(instant: string): string {
  const date = new Date(instant);
  if (Number.isNaN(date.getTime())) return '–';
  return date.toLocaleDateString('en-GB', { day: 'numeric', month: 'short', year: 'numeric' });
}

/** "14 Nov 2026, 14:02". */
export function formatInstant(instant: string): string {
  const date = new Date(instant);
  if (Number.isNaN(date.getTime())) return '–';
  return `${formatDay(instant)}, ${date.toLocaleTimeString('en-GB', { hour: '2-digit', minute: '2-digit' })}`;
}

/** A plain date (YYYY-MM-DD) has no time zone: it is printed as it is. */
export function formatPlainDate(date: string): string {
  const [year, month, day] = date.split('-').map(Number);
  if (year === undefined || month === undefined || day === undefined) return date;
  return formatDay(new Date(year, month - 1, day, 12).toISOString());
}

/** Today as a plain date in the person's own time zone. */
export function today(now: Date = new Date()): string {
  const pad = (part: number): string => String(part).padStart(2, '0');
  return `${now.getFullYear()}-${pad(now.getMonth() + 1)}-${pad(now.getDate())}`;
}
