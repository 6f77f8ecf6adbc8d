'use server';

import type { Route } from 'next';
import { redirect } from 'next/navigation';
import { moveMeetingSchema, placeMeetingSchema, removeMeetingSchema } from '@/lib/schemas/meeting';
import { action } from '@/lib/server/action';
import { moveMeeting } from '@/lib/server/timetable/move-meeting';
import { placeMeeting } from '@/lib/server/timetable/place-meeting';
import { removeMeeting } from '@/lib/server/timetable/remove-meeting';
import { type Done, timetableHref } from './_components/view';

const on = { kind: 'camp', field: 'campId' } as const;
const backTo = (done: Done) => (_: unknown, input: { campId: string; view?: string }) =>
  redirect(timetableHref(input.campId, input.view ?? '', { done }) as Route);

export const placeMeetingAction = action({
  schema: placeMeetingSchema,
  permission: 'timetable.edit',
  on,
  run: placeMeeting,
  onOk: backTo('placed'),
});

export const moveMeetingAction = action({
  schema: moveMeetingSchema,
  permission: 'timetable.edit',
  on,
  run: moveMeeting,
  onOk: backTo('moved'),
});

export const removeMeetingAction = action({
  schema: removeMeetingSchema,
  permission: 'timetable.edit',
  on,
  run: removeMeeting,
  onOk: backTo('removed'),
});
