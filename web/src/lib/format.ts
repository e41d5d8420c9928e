const COUNT = new Intl.NumberFormat('en-GB');

/** Times are shown in UTC as logs of pipelines write them (ISO 8601), so that they sort and cannot be misread. */
export const date = (timestamp: string): string => new Date(timestamp).toISOString().slice(0, 10);
/** For columns whose heading says UTC. */
export const time = (timestamp: string): string => `${date(timestamp)} ${new Date(timestamp).toISOString().slice(11, 19)}`;
export const dateTime = (timestamp: string): string => `${time(timestamp)} UTC`;
export const count = (value: number): string => COUNT.format(value);

/** A duration in milliseconds with sensible digits. */
export const milliseconds = (value: number): string => (value < 10 ? `${value.toFixed(1)} ms` : value < 10_000 ? `${Math.round(value)} ms` : `${(value / 1000).toFixed(1)} s`);

/** "1 attitude", "2 attitudes". */
export const plural = (value: number, noun: string): string => `${count(value)} ${noun}${value === 1 ? '' : 's'}`;
