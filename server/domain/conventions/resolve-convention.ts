import { asCoreConvention, type ConventionReference } from '#shared/api/convention.ts';
import type { Convention } from '#shared/attitude/convention.ts';
import { DomainError } from '../errors.ts';
import { findPreset } from './presets.ts';

/**
 * The convention that a body names, with every facet.
 * @param pointer - JSON pointer of the reference in the body, for the error.
 * @throws DomainError `unknown-preset`, `unknown-interface`.
 */
export function resolveConvention(reference: ConventionReference, pointer: string): Convention {
  if ('preset' in reference) {
    const preset = findPreset(reference.preset);
    if (preset) return preset.convention;
    const message = `there is no preset "${reference.preset}"; GET /api/v1/conventions lists them`;
    throw new DomainError('unknown-preset', `At ${pointer}, ${message}.`, [{ pointer: `${pointer}/preset`, message }]);
  }
  if ('interface' in reference) {
    const message = `there is no published interface "${reference.interface}" with a version ${reference.version}`;
    throw new DomainError('unknown-interface', `At ${pointer}, ${message}.`, [{ pointer, message }]);
  }
  return asCoreConvention(reference);
}
