import type { Convention } from '../../../../../shared/attitude/convention.ts';

/** The component equation that a convention makes true, in words and symbols: no adjective such as "active" or "passive". */
export function definingEquation(convention: Convention): string {
  const r = `v[${convention.reference}]`;
  const b = `v[${convention.body}]`;
  switch (convention.representation) {
    case 'euler': {
      const letters = [...convention.sequence];
      const turned = convention.motion === 'intrinsic' ? 'of the axes as already turned' : 'of the fixed reference axes';
      return `The reference axes ${convention.reference} are carried onto the body axes ${convention.body} by three rotations, about ${letters.join(', then ')} ${turned}. Number listed = sign × angle.`;
    }
    case 'dcm': return convention.maps === 'body-to-reference' ? `${r} = M ${b}` : `${b} = M ${r}`;
    case 'quaternion': {
      const matrix = convention.product === 'hamilton' ? 'R(q)' : 'R(q)ᵀ';
      return `${convention.maps === 'body-to-reference' ? `${r} = ${matrix} ${b}` : `${b} = ${matrix} ${r}`}, with R(q) = (w² − v·v) I + 2 v vᵀ + 2 w [v×]`;
    }
    default: {
      const numbers = { 'rotation-vector': 'a n', 'axis-angle': '(n, a)', mrp: 'n tan(a/4)', gibbs: 'n tan(a/2)' }[convention.representation];
      return `${convention.maps === 'body-to-reference' ? `${r} = R(q) ${b}` : `${b} = R(q) ${r}`} for q = (cos a/2, n sin a/2); the numbers are ${numbers}`;
    }
  }
}
