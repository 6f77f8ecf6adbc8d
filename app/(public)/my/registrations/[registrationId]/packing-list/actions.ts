'use server';

import { revalidatePath } from 'next/cache';
import { mailPackingListSchema, ownHarpsSchema } from '@/lib/schemas/booking';
import { action } from '@/lib/server/action';
import { mailPackingList } from '@/lib/server/packing/mail-packing-list';
import { saveOwnHarps } from '@/lib/server/packing/save-own-harps';

export const mailPackingListAction = action({
  schema: mailPackingListSchema,
  permission: 'registration.read',
  on: { kind: 'registration', field: 'registrationId' },
  rate: 'mail-link',
  run: ({ registrationId }, { now }) => mailPackingList(registrationId, now),
});

export const saveOwnHarpsAction = action({
  schema: ownHarpsSchema,
  permission: 'registration.read',
  on: { kind: 'registration', field: 'registrationId' },
  run: (input) => saveOwnHarps(input),
  onOk: (_, { registrationId }) => revalidatePath(`/my/registrations/${registrationId}/packing-list`),
});
