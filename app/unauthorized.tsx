import type { Metadata } from 'next';
import { DeadEnd } from '@/components/ui/dead-end';
import { SiteShell } from './_components/site-shell';

export const metadata: Metadata = { title: 'Sign in first' };

export default function Unauthorized() {
  return (
    <SiteShell>
      <DeadEnd title="Sign in to go on" way={{ href: '/sign-in', words: 'Sign in' }}>
        <p>
          This page is for people with an account. Your place in it is kept: sign in and open the link again.
        </p>
      </DeadEnd>
    </SiteShell>
  );
}
