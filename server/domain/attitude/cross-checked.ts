import type { CrossCheckRequest, CrossCheckResult } from '#server/cross-check/cross-check.ts';
import type { CrossChecker } from '#server/cross-check/cross-checker.ts';
import { DomainError } from '../errors.ts';

/** Beyond these angles, rad, an answer is not what the core promises, and none is given. */
const EXACT_WITHIN_RAD = 1e-15;
const PACKAGE_WITHIN_RAD = 1e-12;

/**
 * The differences between an answer and its independent recomputation.
 * @throws DomainError `cross-check-failed` where they disagree beyond the stated accuracy: never a quiet answer.
 */
export async function crossChecked(checker: Pick<CrossChecker, 'check'>, request: CrossCheckRequest): Promise<{ maxUlp: number; maxAngleRad: number; methods: { method: string; maxUlp?: number; maxAngleRad: number }[] }> {
  const result: CrossCheckResult = await checker.check(request);
  const [exact, byPackage] = result.methods;
  if (!(exact!.maxAngleRad <= EXACT_WITHIN_RAD) || !(byPackage!.maxAngleRad <= PACKAGE_WITHIN_RAD)) {
    throw new DomainError('cross-check-failed', `The answer differs from its recomputation by ${exact!.maxAngleRad} rad (64 digits) and ${byPackage!.maxAngleRad} rad (package). The failure is logged.`);
  }
  return { ...result, methods: result.methods.map((each) => ({ ...each })) };
}
