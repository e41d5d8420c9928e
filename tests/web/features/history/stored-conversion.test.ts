import { describe, expect, it } from 'vitest';
import { readStoredConversion, workbenchAddress } from '../../../../web/src/features/history/model/stored-conversion.ts';

const facets = { representation: 'dcm', reference: 'NED', body: 'FRD', maps: 'reference-to-body', layout: 'row-major' };

describe('a stored conversion', () => {
  it('becomes an address of the workbench, attitude by attitude', () => {
    const stored = readStoredConversion(JSON.stringify({ from: { preset: 'aircraft-euler-deg' }, to: facets, attitudes: [[1, 2, 3], [-0.5, 1e-9, 4]] }))!;
    const search = new URL(workbenchAddress(stored, 1), 'http://x').searchParams;
    expect(search.get('from')).toBe('aircraft-euler-deg');
    expect(JSON.parse(search.get('to')!)).toEqual(facets);
    expect(search.getAll('n').map(Number)).toEqual([-0.5, 1e-9, 4]);
  });

  it('may hold a matrix as three rows', () => {
    expect(readStoredConversion(JSON.stringify({ from: facets, to: facets, attitudes: [[[1, 0, 0], [0, 1, 0], [0, 0, 1]]] }))!.attitudes).toEqual([[1, 0, 0, 0, 1, 0, 0, 0, 1]]);
  });

  it.each(['{', '[]', 'null', '{"from":{"preset":"a"},"to":{"preset":"b"},"attitudes":[]}', '{"from":{"preset":"a"},"to":{"preset":"b"},"attitudes":[["1"]]}', '{"from":{"interface":"a","version":1},"to":{"preset":"b"},"attitudes":[[1]]}', '{"to":{"preset":"b"},"attitudes":[[1]]}'])('is not made of %s', (text) => {
    expect(readStoredConversion(text)).toBeNull();
  });
});
