import type { Convention } from '../../../../../shared/attitude/convention.ts';
import type { EquivalentStatement } from '../../../../../shared/attitude/identification/identification.ts';

const NUMBERS_ARE = { 'half-angle': 'of half the rotation', 'double-angle': 'of twice the rotation', 'vector-part': 'its vector part only' } as const;

/** A convention in one line, the facets that tell it from its neighbours first. */
export function conventionLine(convention: Convention): string {
  const between = `${convention.reference} and ${convention.body}`;
  switch (convention.representation) {
    case 'euler': {
      const order = convention.order.join() === '1,2,3' ? '' : `, listed ${convention.order.join('-')}`;
      const signs = convention.signs.every((sign) => sign === 1) ? '' : `, signs ${convention.signs.map((sign) => (sign === 1 ? '+' : '−')).join(' ')}`;
      return `Euler angles ${convention.sequence} ${convention.motion}, ${convention.unit}${order}${signs}; ${between}`;
    }
    case 'quaternion': return `quaternion, scalar ${convention.scalar}, ${convention.product === 'hamilton' ? 'Hamilton' : 'Shuster'}, ${convention.maps}; ${between}`;
    case 'dcm': return `matrix, ${convention.maps}, ${convention.layout}; ${between}`;
    case 'rotation-vector': return `rotation vector, ${convention.unit}, ${convention.maps}; ${between}`;
    case 'axis-angle': return `axis and angle, ${convention.unit}, ${convention.maps}; ${between}`;
    case 'mrp': return `modified Rodrigues parameters, ${convention.maps}; ${between}`;
    case 'gibbs': return `Gibbs vector, ${convention.maps}; ${between}`;
  }
}

export function statementLine({ convention, numbersAre, constantOffset = [] }: EquivalentStatement): string {
  const offsets = constantOffset.map(({ side, angle, unit, axis }) => `${side} turned ${number(angle)} ${unit} about (${axis.map((component) => component.toFixed(3)).join(', ')})`);
  return [conventionLine(convention), ...(numbersAre ? [NUMBERS_ARE[numbersAre]] : []), ...offsets].join('; ');
}

/** Four digits; very small ones as powers of ten. */
export const number = (value: number): string => (value !== 0 && Math.abs(value) < 1e-3 ? value.toExponential(2) : String(Number(value.toPrecision(4))));
