import type { Metadata } from 'next';
import { notFound } from 'next/navigation';
import { DoorDesk } from '@/components/door/door-desk';
import { Notice } from '@/components/ui/notice';
import { isId } from '@/lib/domain/shared/ids';
import { sayDays } from '@/lib/domain/shared/say-date';
import { requirePermission } from '@/lib/server/access/require-permission';
import { getCampHead } from '@/lib/server/camps/get-camp-head';
import { countArrivals } from '@/lib/server/door/count-arrivals';

export const metadata: Metadata = { title: 'Door' };

export default async function DoorPage({ params }: PageProps<'/door/[campId]'>) {
  const { campId } = await params;
  if (!isId('cmp', campId)) notFound();
  await requirePermission('door.work', { kind: 'camp', id: campId });
  const camp = getCampHead(campId);
  if (!camp) notFound();
  const { confirmed, arrived } = countArrivals(campId);

  return (
    <>
      <p className="text-small text-soft">{sayDays(camp.startsOn, camp.endsOn)}</p>
      <h1 className="mb-3 text-h2">{camp.name}</h1>
      <noscript>
        <Notice tone="stop" title="The door needs JavaScript">
          Scanning and marking arrivals run in the browser. Switch JavaScript on for this page.
        </Notice>
      </noscript>
      <DoorDesk campId={campId} confirmed={confirmed} arrived={arrived} />
    </>
  );
}
