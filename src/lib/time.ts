const clock = new Intl.DateTimeFormat('en-GB', { hour: '2-digit', minute: '2-digit' });
const day = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'short', year: 'numeric' });

/** `12:41` in local time. */
export const clockTime = (date: Date | string): string => clock.format(new Date(date));
/** `3 Nov 2026` in local time. */
export const dayOf = (date: Date | string): string => day.format(new Date(date));
/** `3 Nov 2026, 12:41`. */
export const dayAndTime = (date: Date | string): string => `${dayOf(date)}, ${clockTime(date)}`;
