import { NUMBERS_PER_ATTITUDE, type Convention } from '#shared/attitude/convention.ts';
import type { StreamedType } from '#shared/api/media-types.ts';
import { columnNames } from './column-names.ts';
import { csvDecoder } from './decode/csv.ts';
import type { Decoder } from './decode/decoder.ts';
import { float64Decoder } from './decode/float64.ts';
import { ndjsonDecoder } from './decode/ndjson.ts';
import { csvEncoder } from './encode/csv.ts';
import type { Encoder } from './encode/encoder.ts';
import { float64Encoder } from './encode/float64.ts';
import { ndjsonEncoder } from './encode/ndjson.ts';

/** A content type with what its parameters say. */
export interface Format {
  readonly type: StreamedType;
  /** CSV only: whether the first line names the columns (RFC 4180, parameter `header`). */
  readonly header: boolean;
}

export function decoderOf({ type, header }: Format, convention: Convention): Decoder {
  const width = NUMBERS_PER_ATTITUDE[convention.representation];
  switch (type) {
    case 'application/octet-stream': return float64Decoder(width);
    case 'text/csv': return csvDecoder(width, header);
    case 'application/x-ndjson': return ndjsonDecoder(width, convention.representation === 'dcm' && convention.layout === 'row-major');
  }
}

export function encoderOf({ type, header }: Format, convention: Convention): Encoder {
  const width = NUMBERS_PER_ATTITUDE[convention.representation];
  switch (type) {
    case 'application/octet-stream': return float64Encoder(width);
    case 'text/csv': return csvEncoder(width, header ? columnNames(convention) : null);
    case 'application/x-ndjson': return ndjsonEncoder(width);
  }
}
