import type { ProblemCode, ProblemItem } from '#shared/api/problems.ts';
import { LISTED_AT_MOST, type AttitudeError } from '#shared/attitude/errors.ts';

/** Why a stream goes no further. A plain value, since it crosses threads. */
export interface Refusal {
  readonly code: ProblemCode;
  readonly message: string;
  /** The attitude refused, counted from 1 over the whole stream; null where no single one is at fault. */
  readonly row: number | null;
  /** Pointers count from 0, as if the body were an array of rows. */
  readonly items: readonly ProblemItem[];
}

/** @param where - Says where in the body the row stands, such as ", line 14". */
export function rowRefusal(code: ProblemCode, index: number, message: string, { column, where = '' }: { column?: number; where?: string } = {}): Refusal {
  return { code, message: `Row ${index + 1}${where} ${message}.`, row: index + 1, items: [{ pointer: `/${index}${column === undefined ? '' : `/${column}`}`, message }] };
}

/** The core's refusal of attitudes, by row. */
export function attitudeRefusal({ code, message, faults, count }: AttitudeError): Refusal {
  const [first] = faults;
  if (!first) return { code, message, row: null, items: [] };
  const others = count > 1 ? `; and ${count - 1} more` : '';
  return {
    code, message: `Row ${first.index + 1} ${first.message}${others}.`, row: first.index + 1,
    items: faults.slice(0, LISTED_AT_MOST).map((fault) => ({ pointer: `/${fault.index}${fault.component === undefined ? '' : `/${fault.component}`}`, message: fault.message })),
  };
}
