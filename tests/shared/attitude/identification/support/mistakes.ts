import { ORDERS, SEQUENCES, type Convention, type EulerConvention } from '#shared/attitude/convention.ts';
import { determinantOf } from '#shared/attitude/relabelling.ts';
import type { Statement } from './statements.ts';

/** One mistake of an interface: what the box really follows, given what was stated. */
export interface Mistake {
  readonly name: string;
  /** Null where it means nothing for this statement. */
  apply(statement: Statement): Statement | null;
}

const onConvention = (name: string, change: (convention: Convention) => Convention | null): Mistake => ({
  name,
  apply: (statement) => {
    const convention = change(statement.convention);
    // Between sets that differ in handedness only a matrix can be listed.
    return convention && (convention.representation === 'dcm' || determinantOf(convention) === 1) ? { ...statement, convention } : null;
  },
});

const onEuler = (name: string, change: (convention: EulerConvention) => Partial<EulerConvention>): Mistake =>
  onConvention(name, (convention) => (convention.representation === 'euler' ? { ...convention, ...change(convention) } : null));

const flipped = (signs: EulerConvention['signs'], which: readonly number[]): EulerConvention['signs'] => signs.map((sign, i) => (which.includes(i) ? -sign : sign)) as unknown as EulerConvention['signs'];

const DEG = Math.PI / 180;

const instead = (name: string, numbers: (statement: Statement) => Statement | null): Mistake => ({ name, apply: numbers });
const reference = (letters: string) => onConvention(`reference axes ${letters}`, (convention) => (convention.reference === letters ? null : { ...convention, reference: letters }));

/** North is taken 5° off; the box sits 2° off about an axis that is none of its own; the answer comes 40 ms late. */
const offset = (name: string, side: 'reference' | 'body', axis: readonly [number, number, number], angle: number): Mistake => ({
  name,
  apply: (statement) => (statement.offsets?.some((each) => each.side === side) ? null : { ...statement, offsets: [...(statement.offsets ?? []), { side, axis, angle }] }),
});
const slanted = [0.6, -0.48, 0.64] as const;

export const MISTAKES: readonly Mistake[] = [
  onConvention('matrix transposed', (c) => (c.representation === 'dcm' ? { ...c, maps: c.maps === 'body-to-reference' ? 'reference-to-body' : 'body-to-reference' } : null)),
  onConvention('matrix column by column', (c) => (c.representation === 'dcm' ? { ...c, layout: c.layout === 'row-major' ? 'column-major' : 'row-major' } : null)),
  onConvention('quaternion conjugated', (c) => (c.representation === 'quaternion' ? { ...c, maps: c.maps === 'body-to-reference' ? 'reference-to-body' : 'body-to-reference' } : null)),
  onConvention('other sense', (c) => (c.representation !== 'quaternion' && c.representation !== 'dcm' && 'maps' in c ? { ...c, maps: c.maps === 'body-to-reference' ? 'reference-to-body' : 'body-to-reference' } : null)),
  onConvention('scalar at the other end', (c) => (c.representation === 'quaternion' ? { ...c, scalar: c.scalar === 'first' ? 'last' : 'first' } : null)),
  onConvention('other product', (c) => (c.representation === 'quaternion' ? { ...c, product: c.product === 'hamilton' ? 'shuster' : 'hamilton' } : null)),
  reference('ENU'),
  reference('NWU'),
  onConvention('ENU and FLU', (c) => ({ ...c, reference: 'ENU', body: 'FLU' })),
  onConvention('body axes FLU', (c) => ({ ...c, body: 'FLU' })),
  onConvention('left-handed import', (c) => ({ ...c, reference: 'NEU', body: 'FRU' })),
  onConvention('left-handed import, x right', (c) => ({ ...c, reference: 'EUN', body: 'RUF' })),
  ...[[0], [1], [2], [0, 1], [0, 2], [1, 2], [0, 1, 2]].map((which) => onEuler(`sign of angle ${which.map((i) => i + 1).join(', ')}`, ({ signs }) => ({ signs: flipped(signs, which) }))),
  onConvention('degrees for radians or the reverse', (c) => ('unit' in c ? { ...c, unit: c.unit === 'deg' ? 'rad' : 'deg' } : null)),
  ...SEQUENCES.map((sequence) => onEuler(`sequence ${sequence}`, () => ({ sequence }))),
  onEuler('extrinsic for intrinsic', ({ motion }) => ({ motion: motion === 'intrinsic' ? 'extrinsic' : 'intrinsic' })),
  ...ORDERS.map((order) => onEuler(`listed ${order.join('-')}`, () => ({ order }))),
  offset('north 5° off', 'reference', [0, 0, 1], 5 * DEG),
  offset('mounting 2° off', 'body', slanted, 2 * DEG),
  { name: 'lag of 40 ms', apply: (statement) => ({ ...statement, lag: (statement.lag ?? 0) + 0.04 }) },
  instead('half angle', (s) => (s.numbersAre || s.convention.representation === 'euler' || s.convention.representation === 'dcm' ? null : { ...s, numbersAre: 'half-angle' })),
  // Twice the rotation of a Gibbs vector is the same for two attitudes half a turn apart: nothing can undo it.
  instead('double angle', (s) => (s.numbersAre || s.convention.representation === 'gibbs' || s.convention.representation === 'euler' || s.convention.representation === 'dcm' ? null : { ...s, numbersAre: 'double-angle' })),
  ...(['rotation-vector', 'mrp', 'gibbs'] as const).flatMap((from) => (['rotation-vector', 'mrp', 'gibbs', 'vector part'] as const).filter((to) => to !== from).map((to) => instead(`${to} for ${from}`, (s) => {
    if (s.convention.representation !== from || s.numbersAre) return null;
    const { reference: r, body, maps } = s.convention;
    switch (to) {
      case 'rotation-vector': return { ...s, convention: { representation: to, reference: r, body, maps, unit: 'rad' } };
      case 'mrp': return { ...s, convention: { representation: to, reference: r, body, maps, shadow: 'inside' } };
      case 'gibbs': return { ...s, convention: { representation: to, reference: r, body, maps } };
      case 'vector part': return { ...s, convention: { representation: 'quaternion', reference: r, body, maps, product: 'hamilton', scalar: 'first', sign: 'any' }, numbersAre: 'vector-part' };
    }
  }))),
];

const axes = { reference: 'NED', body: 'FRD' } as const;

/** What interfaces state. */
export const STATED: readonly Convention[] = [
  { representation: 'euler', ...axes, sequence: 'ZYX', motion: 'intrinsic', unit: 'deg', order: [1, 2, 3], signs: [1, 1, 1], range: 'signed' },
  { representation: 'euler', ...axes, sequence: 'ZXZ', motion: 'intrinsic', unit: 'rad', order: [1, 2, 3], signs: [1, 1, 1], range: 'signed' },
  { representation: 'quaternion', ...axes, scalar: 'first', product: 'hamilton', maps: 'body-to-reference', sign: 'any' },
  { representation: 'dcm', ...axes, maps: 'reference-to-body', layout: 'row-major' },
  { representation: 'rotation-vector', ...axes, maps: 'body-to-reference', unit: 'rad' },
  { representation: 'axis-angle', ...axes, maps: 'body-to-reference', unit: 'deg' },
  { representation: 'mrp', ...axes, maps: 'body-to-reference', shadow: 'inside' },
  { representation: 'gibbs', ...axes, maps: 'body-to-reference' },
];
