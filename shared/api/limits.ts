/** Most attitudes that one JSON call may carry, where its caller's limits allow as many. */
export const ATTITUDES_PER_CALL = 100_000;
/** Most bytes of one JSON body, after decompression. 100,000 matrices at full precision take about 20 MB. */
export const JSON_BODY_BYTES = 32 * 1024 * 1024;
/** Bytes of a body that the history keeps at most, where it keeps bodies at all. */
export const KEPT_BODY_BYTES = 64 * 1024;
/** Rows of one page of a list. */
export const PAGE_SIZE = { default: 50, most: 200 } as const;
/** Most attitudes of a call that asks for a cross-check: each takes milliseconds. */
export const CROSS_CHECKED_PER_CALL = 1_000;
