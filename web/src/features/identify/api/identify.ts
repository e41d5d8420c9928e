import { useMutation } from '@tanstack/react-query';
import type { Convention } from '../../../../../shared/attitude/convention.ts';
import type { Identification } from '../../../../../shared/attitude/identification/identification.ts';
import { client, dataOf } from '../../../lib/api-client.ts';
import type { components } from '../../../lib/contract.gen.ts';

export type { Identification };

export interface IdentifyRequest {
  readonly reference: { readonly convention: Convention; readonly attitudes: readonly (readonly number[])[] };
  readonly observed: { readonly representation: Convention['representation']; readonly numbers: readonly (readonly number[])[]; readonly stated?: Convention };
  readonly times?: readonly number[];
  readonly noise: { readonly angle: number; readonly unit: 'deg' | 'rad' };
}

/** The client loosens tuples to arrays; the contract has them. */
export function useIdentify() {
  return useMutation({
    mutationFn: async (request: IdentifyRequest) => (await dataOf(client.POST('/identify', { body: request as unknown as components['schemas']['IdentifyInput'] }))) as unknown as Identification,
  });
}
