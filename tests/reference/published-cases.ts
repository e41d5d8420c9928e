import { readFileSync } from 'node:fs';

/** A case from a standard, handbook, paper or library, with its source. Numbers as published, or computed from published formulas where `value_origin` says so. */
export interface PublishedCase {
  readonly id: string;
  readonly kind: string;
  readonly source: string;
  readonly locator: string;
  /** Recalled from memory rather than read from the source: agreement then supports both, disagreement proves nothing. */
  readonly recalled_from_memory: boolean;
  readonly value_origin: string;
  readonly convention: Readonly<Record<string, string>>;
  // Every case has a shape of its own; published-cases.test.ts says how each is read.
  // eslint-disable-next-line @typescript-eslint/no-explicit-any
  readonly input: any;
  // eslint-disable-next-line @typescript-eslint/no-explicit-any
  readonly expected: any;
  readonly tolerance: { readonly abs: number };
  readonly note: string;
}

export const PUBLISHED_CASES = JSON.parse(readFileSync(new URL('published-cases.json', import.meta.url), 'utf8')) as PublishedCase[];
