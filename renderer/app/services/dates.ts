const day = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'short', year: 'numeric' });
const minute = new Intl.DateTimeFormat('en-GB', { dateStyle: 'medium', timeStyle: 'short' });

/** `3 Mar 2026` */
export const dayOf = (iso: string): string => day.format(new Date(iso));
/** `3 Mar 2026, 21:40` */
export const minuteOf = (iso: string): string => minute.format(new Date(iso));
