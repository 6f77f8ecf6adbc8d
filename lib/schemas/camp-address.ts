import { z } from 'zod';

/** The slug in a camp's public address. */
export const campAddressSchema = z.object({
  params: z.object({ slug: z.string().regex(/^[a-z0-9][a-z0-9-]{0,119}$/, 'This is not a camp’s address.') }),
});
