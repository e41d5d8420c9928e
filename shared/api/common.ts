import { z } from 'zod';
import { PAGE_SIZE } from './limits.ts';
import { ROLES } from './roles.ts';

export const role = z.enum(ROLES).meta({ id: 'Role' });
export const timestamp = z.iso.datetime({ offset: true }).meta({ examples: ['2026-05-04T08:30:00.000Z'] });

export const person = z.strictObject({ id: z.string(), name: z.string(), email: z.string(), role }).meta({ id: 'Person' });

/** Query values arrive as text; these say so and turn them into what they mean. */
export const pageQuery = {
  cursor: z.string().optional().meta({ description: 'As given by the page before.' }),
  limit: z.string().regex(/^[0-9]{1,3}$/, { error: `must be a whole number from 1 to ${PAGE_SIZE.most}` })
    .refine((text) => Number(text) >= 1 && Number(text) <= PAGE_SIZE.most, { error: `must be a whole number from 1 to ${PAGE_SIZE.most}` })
    .optional().meta({ description: `Rows a page, 1 to ${PAGE_SIZE.most}; ${PAGE_SIZE.default} when absent.` }),
};
