/** Content types in which POST /convert takes and gives attitudes, beside JSON. */
export const STREAMED_TYPES = ['application/x-ndjson', 'text/csv', 'application/octet-stream'] as const;
export type StreamedType = (typeof STREAMED_TYPES)[number];

export const JSON_TYPE = 'application/json';
export type AttitudeType = StreamedType | typeof JSON_TYPE;
