'use server';

import { instructorRowSchema, instructorSchema } from '@/lib/schemas/instructor';
import { action } from '@/lib/server/action';
import { deleteInstructor } from '@/lib/server/instructors/delete-instructor';
import { saveInstructor } from '@/lib/server/instructors/save-instructor';
import { goToCamp } from '../../../../_components/go-to';

export const saveInstructorAction = action({
  schema: instructorSchema,
  permission: 'camp.edit',
  on: { kind: 'camp', field: 'campId' },
  run: saveInstructor,
  onOk: (_, { campId, instructorId }) => goToCamp(campId, '/instructors', instructorId ? 'saved' : 'added'),
});

export const deleteInstructorAction = action({
  schema: instructorRowSchema,
  permission: 'camp.edit',
  on: { kind: 'camp', field: 'campId' },
  run: deleteInstructor,
  onOk: (_, { campId }) => goToCamp(campId, '/instructors', 'deleted'),
});
