/** A stored request for a conversion, as far as the workbench can show it. */
export interface StoredConversion {
  readonly from: string;
  readonly to: string;
  readonly attitudes: readonly (readonly number[])[];
}

/** Null for a body that is no conversion the workbench can show: it takes a preset or every facet, and one attitude at a time. */
export function readStoredConversion(text: string): StoredConversion | null {
  try {
    const { from, to, attitudes } = JSON.parse(text) as Record<string, unknown>;
    const rows = Array.isArray(attitudes) ? attitudes.map((row: unknown) => (Array.isArray(row) ? row.flat() : null)) : [];
    const [a, b] = [statementText(from), statementText(to)];
    if (a === null || b === null || rows.length === 0 || !rows.every((row) => row?.every((number) => typeof number === 'number'))) return null;
    return { from: a, to: b, attitudes: rows as number[][] };
  } catch {
    return null;
  }
}

/** As the workbench's address writes it: a preset's id, or the facets as JSON. */
function statementText(reference: unknown): string | null {
  if (typeof reference !== 'object' || reference === null || 'interface' in reference) return null;
  return 'preset' in reference ? String(reference.preset) : JSON.stringify(reference);
}

/** The workbench's address with one of the request's attitudes. */
export function workbenchAddress({ from, to, attitudes }: StoredConversion, index: number): string {
  return `/workbench?${new URLSearchParams([['from', from], ['to', to], ...(attitudes[index] ?? []).map((number): [string, string] => ['n', String(number)])])}`;
}
