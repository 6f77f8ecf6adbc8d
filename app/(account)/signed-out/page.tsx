import type { Metadata, Route } from 'next';
import { ButtonLink } from '@/components/ui/button';
import { PageHead } from '@/components/ui/page-head';

export const metadata: Metadata = { title: 'Signed out', robots: { index: false } };

export default function SignedOutPage() {
  return (
    <>
      <PageHead
        title="Signed out"
        lead="This browser no longer shows your bookings. On a shared computer, close its window too."
      />
      <p className="flex flex-wrap gap-3">
        <ButtonLink href={'/sign-in' as Route} tone="primary">
          Sign in again
        </ButtonLink>
        <ButtonLink href="/">See the camps</ButtonLink>
      </p>
    </>
  );
}
