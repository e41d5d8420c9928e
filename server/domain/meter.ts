/** What a call has used and what it was warned of; kept in the history with the answer. */
export interface Meter {
  attitudes: number;
  warnings: number;
  warningCodes: string[];
}

export const emptyMeter = (): Meter => ({ attitudes: 0, warnings: 0, warningCodes: [] });
