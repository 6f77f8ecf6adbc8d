import 'server-only';
import { asc, eq } from 'drizzle-orm';
import { user } from '@/db/schema/account';
import { instructor } from '@/db/schema/camp';
import type { CampId, InstructorId, UserId } from '@/lib/domain/shared/ids';
import { getDb } from '../db';

export type InstructorLine = {
  id: InstructorId;
  name: string;
  bio: string;
  account: { id: UserId; name: string; email: string } | null;
};

/** A camp's instructors in their order, with the account each is linked to. For staff: it names e-mail addresses. */
export const listInstructors = (campId: CampId): InstructorLine[] =>
  getDb()
    .select({
      id: instructor.id,
      name: instructor.name,
      bio: instructor.bio,
      account: { id: user.id, name: user.name, email: user.email },
    })
    .from(instructor)
    .leftJoin(user, eq(user.id, instructor.userId))
    .where(eq(instructor.campId, campId))
    .orderBy(asc(instructor.position), asc(instructor.id))
    .all();
