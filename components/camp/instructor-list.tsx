import type { Programme } from '@/lib/domain/timetable/programme';
import { PlainText } from '../ui/plain-text';

export function InstructorList({ instructors }: Pick<Programme, 'instructors'>) {
  return (
    <ul className="grid gap-x-10 gap-y-6 sm:grid-cols-2">
      {instructors.map(({ id, name, bio }) => (
        <li key={id} className="min-w-0">
          <h3 className="break-words">{name}</h3>
          {bio && <PlainText text={bio} className="mt-1" />}
        </li>
      ))}
    </ul>
  );
}
