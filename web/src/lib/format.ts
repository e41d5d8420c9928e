const DATE_TIME = new Intl.DateTimeFormat('en-GB', { dateStyle: 'medium', timeStyle: 'medium', timeZone: 'UTC' });
const DATE = new Intl.DateTimeFormat('en-GB', { dateStyle: 'medium', timeZone: 'UTC' });
const COUNT = new Intl.NumberFormat('en-GB');

/** Times are shown in UTC, as logs of pipelines are. */
export const dateTime = (timestamp: string): string => `${DATE_TIME.format(new Date(timestamp))} UTC`;
export const date = (timestamp: string): string => DATE.format(new Date(timestamp));
export const count = (value: number): string => COUNT.format(value);

/** A duration in milliseconds with sensible digits. */
export const milliseconds = (value: number): string => (value < 10 ? `${value.toFixed(1)} ms` : value < 10_000 ? `${Math.round(value)} ms` : `${(value / 1000).toFixed(1)} s`);

/** "1 attitude", "2 attitudes". */
export const plural = (value: number, noun: string): string => `${count(value)} ${noun}${value === 1 ? '' : 's'}`;
