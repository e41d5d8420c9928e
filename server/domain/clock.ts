/** Milliseconds since 1970-01-01 UTC; passed in so that tests can set the time. */
export type Clock = () => number;

export const toTimestamp = (milliseconds: number): string => new Date(milliseconds).toISOString();
export const toTimestampOrNull = (milliseconds: number | null): string | null => (milliseconds === null ? null : toTimestamp(milliseconds));
