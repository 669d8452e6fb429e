/** Whether `text` is `YYYY-MM-DD` and a day that exists in the Gregorian calendar. */
export function isCalendarDate(text: string): boolean {
  if (!/^\d{4}-\d{2}-\d{2}$/.test(text)) return false;
  const day = new Date(`${text}T00:00:00Z`);
  // the engine rolls 30 February over into March instead of refusing it
  return !Number.isNaN(day.getTime()) && day.toISOString().startsWith(text);
}
