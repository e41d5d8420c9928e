import { describe, expect, it } from 'vitest';
import { PRESETS } from '../../../../shared/attitude/presets.ts';
import { readStatement, statementOf } from '../../../../web/src/features/workbench/model/workbench-state.ts';

const facets = { representation: 'quaternion', reference: 'NED', body: 'FRD', scalar: 'last', product: 'hamilton', maps: 'body-to-reference', sign: 'any' };

describe('a convention in an address', () => {
  it.each(PRESETS.map(({ id }) => id))('is the preset %s by its id, and the same facets in full without it', (id) => {
    const { convention } = statementOf(id);
    expect(readStatement(id)).toEqual({ preset: id, convention });
    expect(readStatement(JSON.stringify(convention))).toEqual({ preset: null, convention });
  });

  it('is every facet and no other', () => {
    expect(readStatement(JSON.stringify(facets))).toEqual({ preset: null, convention: facets });
    const { sign: _sign, ...without } = facets;
    expect(readStatement(JSON.stringify(without))).toBeNull();
    expect(readStatement(JSON.stringify({ ...facets, layout: 'row-major' }))).toBeNull();
  });

  it.each([null, '', 'no-such-preset', '{', '[]', 'null', '"NED"', '{"representation":"__proto__"}'])('is nothing when the address says %j', (text) => {
    expect(readStatement(text)).toBeNull();
  });

  it.each([['reference', 'NEN'], ['reference', 'FRD'], ['body', 'FR'], ['body', 7], ['scalar', 'middle'], ['maps', 'MAPS']])('is nothing with %s %j', (facet, value) => {
    expect(readStatement(JSON.stringify({ ...facets, [facet]: value }))).toBeNull();
  });
});
