import type { Convention } from '../../../../../shared/attitude/convention.ts';

/** What each number of a convention is called, in the order it lists them. */
export function numberLabels(convention: Convention): string[] {
  switch (convention.representation) {
    case 'euler': {
      const names = convention.sequence === 'ZYX' && convention.motion === 'intrinsic' && /D$/.test(convention.reference) && convention.body === 'FRD' ? ['yaw', 'pitch', 'roll'] : null;
      return convention.order.map((turn) => (names ? names[turn - 1]! : `angle ${turn} about ${convention.sequence[turn - 1]}`));
    }
    case 'quaternion': return convention.scalar === 'first' ? ['w', 'x', 'y', 'z'] : ['x', 'y', 'z', 'w'];
    case 'dcm': return [1, 2, 3].flatMap((i) => [1, 2, 3].map((j) => (convention.layout === 'row-major' ? `m${i}${j}` : `m${j}${i}`)));
    case 'axis-angle': return ['x', 'y', 'z', 'angle'];
    default: return ['x', 'y', 'z'];
  }
}
