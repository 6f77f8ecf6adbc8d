import type { Metadata, Route } from 'next';
import Link from 'next/link';
import { CampBill } from '@/components/camp/camp-bill';
import { PastCamps } from '@/components/camp/past-camps';
import { Empty } from '@/components/ui/empty';
import { Section } from '@/components/ui/section';
import { listPublicCamps } from '@/lib/server/camps/list-public-camps';

export const metadata: Metadata = {
  title: { absolute: 'Harmonica camps · Combwood' },
  description: 'Multi-day harmonica workshops: dates, tracks, harps to bring and places left.',
  alternates: { canonical: '/' },
};

export default function CampsPage() {
  const { coming, past } = listPublicCamps(Date.now());
  return (
    <>
      <h1 className="text-h1">Harmonica camps</h1>
      <p className="mb-10 mt-2 max-w-prose text-lead text-soft">
        Days of workshops for players of every level. Pick a camp, find your track, see which harps to bring.
      </p>
      {coming.length > 0 ? (
        <ol>
          {coming.map((camp) => (
            <CampBill key={camp.slug} camp={camp} />
          ))}
        </ol>
      ) : (
        <Empty title="No camp is announced just now">
          <p>
            When an organiser publishes one, it is here with its whole programme. Do you run camps yourself?{' '}
            <Link href={'/organise' as Route}>Set one up</Link>.
          </p>
        </Empty>
      )}
      {past.length > 0 && (
        <Section id="past" title="Past camps" note="Their programmes stay to look back at.">
          <PastCamps camps={past} />
        </Section>
      )}
    </>
  );
}
