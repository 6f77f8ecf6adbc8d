import { z } from 'zod';
import { type Id, type IdPrefix, isId } from '@/lib/domain/shared/ids';

/** The id of a row as a form or an address sends it. Says nothing of whether the row exists or whose it is. */
export const rowId = <P extends IdPrefix>(prefix: P) =>
  z
    .string({ error: 'Choose one of the list.' })
    .refine((value): value is Id<P> => isId(prefix, value), 'Choose one of the list.');
