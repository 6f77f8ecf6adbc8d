import type { Metadata, Route } from 'next';
import Link from 'next/link';
import { ActionForm } from '@/components/forms/action-form';
import { Notice } from '@/components/ui/notice';
import { PageHead } from '@/components/ui/page-head';
import { suggestEmail } from '@/lib/domain/account/suggest-email';
import { listCommonDomains } from '@/lib/server/auth/list-common-domains';
import { getOpening } from '@/lib/server/auth/opening-cookie';
import { resendVerificationAction } from '../actions';

export const metadata: Metadata = { title: 'Look in your mail', robots: { index: false } };

export default async function SignUpSentPage() {
  const opening = await getOpening();
  const meant = opening && suggestEmail(opening.email, listCommonDomains());
  return (
    <>
      <PageHead
        title="Look in your mail"
        lead={
          opening ? (
            <>
              We wrote to <strong className="wrap-anywhere text-ink">{opening.email}</strong>. The letter has
              a link; press it and your account is ready.
            </>
          ) : (
            'We wrote to the address that you gave. The letter has a link; press it and your account is ready.'
          )
        }
      />
      {meant && (
        <Notice title="Is that address right?">
          <p>
            It looks like <strong className="wrap-anywhere">{meant}</strong> with a slip of the finger. If so,{' '}
            <Link href={'/sign-up' as Route}>open the account again</Link> with the right one.
          </p>
        </Notice>
      )}
      <h2 className="mt-10 text-h3">Nothing there?</h2>
      <p className="mt-2 mb-4 max-w-prose text-soft">
        Give it a few minutes and look in the folder for unwanted mail. Then have it sent once more.
      </p>
      <ActionForm
        action={resendVerificationAction}
        submit="Send it again"
        tone="plain"
        done="If there is anything to confirm, another letter is on its way."
      />
    </>
  );
}
