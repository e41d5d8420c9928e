import { useMutation } from '@tanstack/react-query';
import type { Convention } from '../../../../../shared/attitude/convention.ts';
import { client, dataOf } from '../../../lib/api-client.ts';
import type { components } from '../../../lib/contract.gen.ts';

export type CrossCheck = components['schemas']['CrossCheck'];

export interface CheckedAnswer {
  readonly numbers: readonly number[];
  readonly crossCheck: CrossCheck;
}

/** Has the service convert one attitude and compute the answer again by independent code. */
export function useCrossCheck() {
  return useMutation({
    mutationFn: async ({ from, to, numbers }: { from: Convention; to: Convention; numbers: readonly number[] }): Promise<CheckedAnswer> => {
      const body = { from, to, attitudes: [[...numbers]], options: { crossCheck: true } } as components['schemas']['ConvertInput'];
      const answer = await dataOf(client.POST('/convert', { body }));
      return { numbers: answer.attitudes[0]!, crossCheck: answer.crossCheck! };
    },
  });
}
