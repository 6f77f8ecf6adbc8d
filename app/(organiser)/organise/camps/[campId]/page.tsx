import type { Metadata } from 'next';
import { PageHead } from '@/components/ui/page-head';
import { sayDays } from '@/lib/domain/shared/say-date';
import { requireCamp } from '@/lib/server/camps/require-camp';

export const metadata: Metadata = { title: 'Overview' };

export default async function CampOverviewPage({ params }: PageProps<'/organise/camps/[campId]'>) {
  const { camp } = await requireCamp((await params).campId, 'camp.read');
  return <PageHead over={sayDays(camp.startsOn, camp.endsOn)} title={camp.name} />;
}
