import { z } from 'zod';
import { isId, type RegistrationId } from '@/lib/domain/shared/ids';

const scanId = z.uuid('The scan needs an id of its own (UUID).');
const deviceAt = z.number().int().min(0).max(8.64e15);
const registrationId = z
  .string()
  .refine((value): value is RegistrationId => isId('reg', value), 'That is not the id of a registration.');

/** What a door device sends: a code it read, a name that was picked, or an arrival to take back. */
export const scanSchema = z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('ticket'), id: scanId, deviceAt, code: z.string().min(1).max(512) }),
  z.object({ kind: z.literal('name'), id: scanId, deviceAt, registrationId }),
  z.object({
    kind: z.literal('undo'),
    id: scanId,
    deviceAt,
    registrationId,
    reason: z
      .string()
      .trim()
      .min(3, 'Say in a word or two why it is taken back.')
      .max(200, 'Keep it under 200 characters.'),
  }),
]);

export type ScanInput = z.output<typeof scanSchema>;
