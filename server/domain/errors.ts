import type { ProblemCode, ProblemItem } from '#shared/api/problems.ts';

/** A use case refuses: `code` decides the answer, `detail` says what was wrong with these very values. */
export class DomainError extends Error {
  override readonly name = 'DomainError';
  readonly code: ProblemCode;
  readonly items: readonly ProblemItem[];
  /** When the same request may succeed; null where waiting does not help. */
  readonly retryAfterSeconds: number | null;

  constructor(code: ProblemCode, detail: string, items: readonly ProblemItem[] = [], retryAfterSeconds: number | null = null) {
    super(detail);
    this.code = code;
    this.items = items;
    this.retryAfterSeconds = retryAfterSeconds;
  }
}
