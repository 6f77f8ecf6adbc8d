import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { toTypedAsk } from '@/components/harp/typed-ask';
import { PageHead } from '@/components/ui/page-head';
import { loadProgramme } from '@/lib/server/camps/load-programme';
import { requireCamp } from '@/lib/server/camps/require-camp';
import { rowMark } from '@/lib/server/camps/row-mark';
import { DeleteBox } from '../../../../../_components/delete-box';
import { WorkshopForm } from '../_components/workshop-form';
import { deleteWorkshopAction } from '../actions';

export const metadata: Metadata = { title: 'Workshop' };

export default async function WorkshopPage({
  params,
}: PageProps<'/organise/camps/[campId]/workshops/[workshopId]'>) {
  const { campId, workshopId } = await params;
  const { camp } = await requireCamp(campId, 'camp.edit');
  const programme = loadProgramme(camp.id);
  const workshop = programme?.workshops.find(({ id }) => id === workshopId);
  if (!programme || !workshop) notFound();
  const { id, title, description, kind, audience, lengthMinutes, capacity, trackIds, instructorIds } =
    workshop;
  return (
    <>
      <PageHead over={`${camp.name} · Workshop`} title={title} />
      <WorkshopForm
        campId={camp.id}
        workshopId={id}
        seen={rowMark(workshop)}
        tracks={programme.tracks}
        instructors={programme.instructors}
        defaultValue={{
          title,
          description,
          kind,
          audience,
          lengthMinutes: String(lengthMinutes),
          capacity: capacity === null ? '' : String(capacity),
          trackIds,
          instructorIds,
          needs: workshop.needs.map(({ level, note, anyOf }) => ({
            level,
            note,
            anyOf: anyOf.map(toTypedAsk),
          })),
        }}
      />
      <DeleteBox
        what="this workshop"
        action={deleteWorkshopAction}
        hidden={{ campId: camp.id, workshopId: id }}
      />
    </>
  );
}
