import type { Convention } from '#shared/attitude/convention.ts';

/** Names for the columns of a convention's numbers, in the order listed. */
export function columnNames(convention: Convention): string[] {
  switch (convention.representation) {
    case 'euler': return convention.order.map((turn) => `angle_${turn}_${convention.sequence[turn - 1]!.toLowerCase()}_${convention.unit}`);
    case 'quaternion': return convention.scalar === 'first' ? ['q_w', 'q_x', 'q_y', 'q_z'] : ['q_x', 'q_y', 'q_z', 'q_w'];
    case 'dcm': return [1, 2, 3].flatMap((a) => [1, 2, 3].map((b) => (convention.layout === 'row-major' ? `m_${a}${b}` : `m_${b}${a}`)));
    case 'axis-angle': return ['axis_x', 'axis_y', 'axis_z', `angle_${convention.unit}`];
    case 'rotation-vector': return ['x', 'y', 'z'].map((axis) => `r_${axis}_${convention.unit}`);
    case 'mrp': return ['mrp_x', 'mrp_y', 'mrp_z'];
    case 'gibbs': return ['gibbs_x', 'gibbs_y', 'gibbs_z'];
  }
}
