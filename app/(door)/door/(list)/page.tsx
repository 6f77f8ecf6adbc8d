import type { Metadata, Route } from 'next';
import { ButtonLink } from '@/components/ui/button';
import { Empty } from '@/components/ui/empty';
import { PageHead } from '@/components/ui/page-head';
import { localDay } from '@/lib/domain/shared/local-time';
import { sayDays } from '@/lib/domain/shared/say-date';
import { requirePermission } from '@/lib/server/access/require-permission';
import { listDoorCamps } from '@/lib/server/door/list-door-camps';

export const metadata: Metadata = { title: 'Doors' };

export default async function DoorsPage() {
  const actor = await requirePermission('account.own');
  const now = Date.now();
  const camps = listDoorCamps(actor).map((camp) => {
    const today = localDay(now, camp.timeZone);
    const place = today < camp.startsOn ? 'later' : today > camp.endsOn ? 'over' : 'now';
    return { ...camp, place, arrivesToday: today === camp.startsOn };
  });
  const open = camps.filter((camp) => camp.place === 'now');
  const others = camps
    .filter((camp) => camp.place !== 'now')
    .sort((a, b) => b.startsOn.localeCompare(a.startsOn));

  return (
    <>
      <PageHead title="Doors" lead="Open the door of a camp, then scan tickets or find people by name." />
      {camps.length === 0 && (
        <Empty title="No door yet">
          Once an organiser gives you the door and publishes a camp, it is here.
        </Empty>
      )}
      {open.map((camp) => (
        <section key={camp.id} className="mb-10 border-l-8 border-brass bg-panel px-5 py-5">
          <h2 className="text-h2">{camp.name}</h2>
          <p className="mb-4 text-lead text-soft">
            {camp.arrivesToday
              ? `Arrival today from ${camp.arrivalFrom}`
              : sayDays(camp.startsOn, camp.endsOn)}
          </p>
          <ButtonLink href={`/door/${camp.id}` as Route} tone="primary">
            Open this door
          </ButtonLink>
        </section>
      ))}
      {others.length > 0 && (
        <>
          <h2 className="mb-2 text-h3">{open.length > 0 ? 'Other camps' : 'Not today'}</h2>
          <ul className="divide-y divide-line border-y border-line">
            {others.map((camp) => (
              <li key={camp.id} className="flex flex-wrap items-center justify-between gap-x-6 py-2">
                <span>
                  <span className="font-semibold">{camp.name}</span>
                  <span className="block text-small text-soft">
                    {sayDays(camp.startsOn, camp.endsOn)}, {camp.place === 'over' ? 'over' : 'to come'}
                  </span>
                </span>
                <ButtonLink href={`/door/${camp.id}` as Route} tone="quiet">
                  Open the door of {camp.name}
                </ButtonLink>
              </li>
            ))}
          </ul>
        </>
      )}
    </>
  );
}
