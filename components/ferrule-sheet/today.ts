/** Today's calendar date where the reader is, as ISO 8601 has it. */
export function today(now: Date = new Date()): string {
  const [year, month, day] = [now.getFullYear(), now.getMonth() + 1, now.getDate()];
  return [String(year).padStart(4, '0'), String(month).padStart(2, '0'), String(day).padStart(2, '0')].join('-');
}
