import type { Metadata } from 'next';
import { DeadEnd } from '@/components/ui/dead-end';
import { SiteShell } from './_components/site-shell';

export const metadata: Metadata = { title: 'Nothing here' };

export default function NotFound() {
  return (
    <SiteShell>
      <DeadEnd title="There is nothing here">
        <p>
          The address may be mistyped, the camp may not be published, or the page is not yours to see. Check
          the link in your mail, or sign in with the address it was sent to.
        </p>
      </DeadEnd>
    </SiteShell>
  );
}
