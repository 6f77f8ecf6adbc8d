import type { Metadata, Route } from 'next';
import { notFound, redirect } from 'next/navigation';
import { ButtonLink } from '@/components/ui/button';
import { Notice } from '@/components/ui/notice';
import { PageHead } from '@/components/ui/page-head';
import { SALE_WORDS } from '@/lib/domain/registration/sale-state';
import { stepPath } from '@/lib/domain/registration/step-path';
import { getPublicCamp } from '@/lib/server/camps/get-public-camp';

export const metadata: Metadata = { title: 'Register', robots: { index: false } };

/** The way in: to the first step, or why there is none just now. */
export default async function RegisterPage({ params }: PageProps<'/camps/[slug]/register'>) {
  const { slug } = await params;
  const found = getPublicCamp(slug);
  if (!found) notFound();
  const { standing, programme } = found;
  if (standing === 'open') redirect(stepPath(slug, 'who') as Route);
  const { camp } = programme;
  return (
    <>
      <PageHead over={camp.name} title="Register" />
      <Notice title={standing === 'full' ? 'No places left' : 'Registration is over'}>
        <p>
          {standing === 'full'
            ? 'Every place is taken just now. One may come back when somebody gives theirs up: look again later, or write to the organisers.'
            : SALE_WORDS[standing === 'past' ? 'begun' : standing]}
        </p>
        <p className="mt-2">
          <a href={`mailto:${camp.organisationEmail}`}>{camp.organisationEmail}</a>
        </p>
      </Notice>
      <ButtonLink href={`/camps/${slug}` as Route}>Back to the camp</ButtonLink>
    </>
  );
}
