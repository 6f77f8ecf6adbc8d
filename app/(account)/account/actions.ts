'use server';

import { revalidatePath } from 'next/cache';
import {
  changeAddressSchema,
  changeNameSchema,
  changePasswordSchema,
  endSessionSchema,
} from '@/lib/schemas/account';
import { action } from '@/lib/server/action';
import { changeAddress } from '@/lib/server/auth/change-address';
import { changeName } from '@/lib/server/auth/change-name';
import { changePassword } from '@/lib/server/auth/change-password';
import { endSession } from '@/lib/server/auth/end-session';

export const changeNameAction = action({
  schema: changeNameSchema,
  permission: 'account.own',
  run: changeName,
  onOk: () => revalidatePath('/account'),
});

export const changePasswordAction = action({
  schema: changePasswordSchema,
  permission: 'account.own',
  hide: ['current', 'password'],
  run: changePassword,
  onOk: () => revalidatePath('/account'),
});

export const changeAddressAction = action({
  schema: changeAddressSchema,
  permission: 'account.own',
  hide: ['current'],
  run: changeAddress,
});

export const endSessionAction = action({
  schema: endSessionSchema,
  permission: 'account.own',
  run: endSession,
  onOk: () => revalidatePath('/account'),
});
