import { describe, expect, it } from 'vitest';
import { betweenReferences, bodyPermutation, BODY_SETS, handedness, isBodyAxes, isReferenceAxes, LOCAL_LEVEL_SETS, referencePermutation } from '#shared/attitude/axes.ts';

describe('axis sets', () => {
  it('are 48 of each kind, half of them left-handed', () => {
    for (const [sets, permutation] of [[LOCAL_LEVEL_SETS, referencePermutation], [BODY_SETS, bodyPermutation]] as const) {
      expect(new Set(sets).size).toBe(48);
      expect(sets.filter((set) => handedness(permutation(set)) === 1)).toHaveLength(24);
    }
  });

  it.each(['NED', 'ENU', 'NWU', 'SEU', 'ECEF'])('%s is right-handed', (set) => expect(handedness(referencePermutation(set))).toBe(1));
  it.each(['NEU', 'END', 'NWD', 'ESU'])('%s is left-handed unless its letters say otherwise', (set) => {
    // x × y = z decides: N × E = D, so NEU is left-handed; E × N = U, so END is; N × W = U, so NWD is; E × S = D, so ESU is.
    expect(handedness(referencePermutation(set))).toBe(-1);
  });

  it('are checked letter by letter', () => {
    for (const bad of ['', 'NE', 'NEDD', 'NSD', 'NNE', 'ned', 'FRD', 'constructor']) expect(isReferenceAxes(bad), bad).toBe(false);
    for (const bad of ['FBD', 'NED', 'frd', 'FRL', '__proto__']) expect(isBodyAxes(bad), bad).toBe(false);
  });

  it('relate by the signed permutation that their letters say: ENU is (east, north, up)', () => {
    expect(betweenReferences('NED', 'ENU')).toEqual({ column: [1, 0, 2], sign: [1, 1, -1] });
    expect(betweenReferences('ENU', 'NED')).toEqual({ column: [1, 0, 2], sign: [1, 1, -1] });
    // A cyclic change is not its own inverse: EDN is (east, down, north).
    expect(betweenReferences('NED', 'EDN')).toEqual({ column: [1, 2, 0], sign: [1, 1, 1] });
    expect(betweenReferences('EDN', 'USW')).toEqual({ column: [1, 2, 0], sign: [-1, -1, -1] });
    expect(betweenReferences('ECEF', 'ECEF')).toEqual({ column: [0, 1, 2], sign: [1, 1, 1] });
    expect(() => betweenReferences('ECEF', 'NED')).toThrow(expect.objectContaining({ code: 'unrelated-frames' }));
    expect(() => betweenReferences('ECEF', 'ICRF')).toThrow(expect.objectContaining({ code: 'unrelated-frames' }));
  });
});
