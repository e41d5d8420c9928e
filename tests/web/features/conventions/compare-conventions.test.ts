import { expect, it } from 'vitest';
import { PRESETS } from '../../../../shared/attitude/presets.ts';
import { compareConventions } from '../../../../web/src/features/conventions/model/compare-conventions.ts';

const of = (id: string) => PRESETS.find((preset) => preset.id === id)!.convention;

it('finds nothing different between a convention and itself', () => {
  for (const { convention } of PRESETS) expect(compareConventions(convention, convention).filter(({ differs }) => differs)).toEqual([]);
});

it('names the one facet in which two differ', () => {
  expect(compareConventions(of('aircraft-euler-deg'), of('aircraft-euler-rad')).filter(({ differs }) => differs)).toEqual([{ facet: 'unit', left: 'deg', right: 'rad', differs: true }]);
  expect(compareConventions(of('aircraft-euler-deg'), of('aircraft-euler-rpy-deg')).filter(({ differs }) => differs)).toEqual([{ facet: 'order', left: '[1, 2, 3]', right: '[3, 2, 1]', differs: true }]);
});

it('says which facets only one of them has', () => {
  const pairs = compareConventions(of('aircraft-dcm'), of('aircraft-quaternion'));
  expect(pairs.filter(({ left }) => left === null).map(({ facet }) => facet)).toEqual(expect.arrayContaining(['scalar', 'product', 'sign']));
  expect(pairs.find(({ facet }) => facet === 'layout')).toEqual({ facet: 'layout', left: 'row-major', right: null, differs: true });
  expect(pairs.find(({ facet }) => facet === 'body')!.differs).toBe(false);
});
