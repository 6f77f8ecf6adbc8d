import { CONTROL } from '@/components/forms/field-frame';
import { Button } from '@/components/ui/button';

type PickInstructorProps = {
  campId: string;
  instructors: readonly { id: string; name: string; own: boolean }[];
  chosen: string | undefined;
};

/** An organiser looks at any instructor's meetings; a GET form, so that it works without JavaScript. */
export function PickInstructor({ campId, instructors, chosen }: PickInstructorProps) {
  return (
    <form
      method="get"
      action={`/organise/camps/${campId}/my-meetings`}
      className="no-print mb-8 flex flex-wrap items-end gap-4"
    >
      <label className="w-full sm:w-72">
        <span className="block text-small font-semibold">Instructor</span>
        <select key={chosen} name="instructor" defaultValue={chosen} className={CONTROL}>
          {instructors.map(({ id, name, own }) => (
            <option key={id} value={id}>
              {own ? `${name} (you)` : name}
            </option>
          ))}
        </select>
      </label>
      <Button type="submit">Show</Button>
    </form>
  );
}
