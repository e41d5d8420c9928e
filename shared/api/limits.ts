/** Most attitudes that one JSON call may carry. */
export const ATTITUDES_PER_CALL = 10_000;
/** Most bytes of one JSON body, after decompression. 10,000 matrices at full precision take about 2 MB. */
export const JSON_BODY_BYTES = 8 * 1024 * 1024;
/** Bytes of a body that the history keeps at most, where it keeps bodies at all. */
export const KEPT_BODY_BYTES = 64 * 1024;
/** Rows of one page of a list. */
export const PAGE_SIZE = { default: 50, most: 200 } as const;
/** Most attitudes of a call that asks for a cross-check: each takes milliseconds. */
export const CROSS_CHECKED_PER_CALL = 1_000;
