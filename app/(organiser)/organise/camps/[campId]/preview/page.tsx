import type { Metadata } from 'next';
import { CampPage } from '@/components/camp/camp-page';
import { Notice } from '@/components/ui/notice';
import { campStanding } from '@/lib/domain/camp/camp-standing';
import { loadProgramme } from '@/lib/server/camps/load-programme';
import { requireCamp } from '@/lib/server/camps/require-camp';
import { countPlaces } from '@/lib/server/registration/count-places';

export const metadata: Metadata = { title: 'Preview' };

export default async function PreviewPage({ params }: PageProps<'/organise/camps/[campId]/preview'>) {
  const { camp } = await requireCamp((await params).campId, 'camp.read');
  const programme = loadProgramme(camp.id);
  const places = countPlaces(camp.id);
  if (!programme || !places) return null;
  return (
    <div className="max-w-page">
      <Notice title="Preview">
        <p>
          {camp.state === 'draft'
            ? 'This is how the public page will look. Only your staff can see it yet.'
            : 'This is the page as the public sees it now.'}
        </p>
      </Notice>
      <CampPage programme={programme} places={places} standing={campStanding(camp, places, Date.now())} />
    </div>
  );
}
