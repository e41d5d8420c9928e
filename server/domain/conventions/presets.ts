import type { PresetDocument } from '#shared/api/conventions.ts';
import { PRESETS, type Preset } from '#shared/attitude/presets.ts';
import { DomainError } from '../errors.ts';

const byId: ReadonlyMap<string, Preset> = new Map(PRESETS.map((preset) => [preset.id, preset]));

/** Interfaces that state a preset's convention come with the interfaces themselves; until then there are none. */
const present = (preset: Preset): PresetDocument => ({
  id: preset.id,
  title: preset.title,
  description: preset.description,
  convention: preset.convention as PresetDocument['convention'],
  standard: preset.standard ?? null,
  worked: { reading: preset.worked.reading, numbers: [...preset.worked.numbers] },
  interfaces: [],
});

export const listPresets = (): PresetDocument[] => PRESETS.map(present);

export function getPreset(id: string): PresetDocument {
  const preset = byId.get(id);
  if (!preset) throw new DomainError('not-found', `There is no preset "${id}". GET /api/v1/conventions lists them.`);
  return present(preset);
}

export const findPreset = (id: string): Preset | undefined => byId.get(id);
