import { scratch as S } from '../arithmetic/scratch.ts';
import { MATRIX } from '../arithmetic/slots.ts';
import type { ElementMap } from './frames.ts';
import { FINE, type Writer } from './status.ts';

/** Writes MATRIX as nine numbers, moved and signed as the map says. */
export function matrixWriter({ index, sign }: ElementMap): Writer {
  const slots = index.map((element) => MATRIX + 2 * element);
  return (numbers, at) => {
    for (let k = 0; k < 9; k++) numbers[at + k] = sign[k]! * S[slots[k]!]! + 0;
    return FINE;
  };
}
