import { z } from 'zod';

/** Which way a row of an ordered list goes, by one place. */
export const towardsSchema = z.enum(['up', 'down'], { error: 'Say up or down.' });
export type Towards = z.output<typeof towardsSchema>;
