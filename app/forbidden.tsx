import type { Metadata } from 'next';
import { DeadEnd } from '@/components/ui/dead-end';
import { SiteShell } from './_components/site-shell';

export const metadata: Metadata = { title: 'Not covered by your role' };

export default function Forbidden() {
  return (
    <SiteShell>
      <DeadEnd title="Your role does not cover this" way={{ href: '/organise', words: 'To my camps' }}>
        <p>
          You are signed in, but this page needs another role in this organisation. Ask an organiser to give
          it to you.
        </p>
      </DeadEnd>
    </SiteShell>
  );
}
