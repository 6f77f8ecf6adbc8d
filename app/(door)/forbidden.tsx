import type { Metadata } from 'next';
import { RoleShort } from '../_components/role-short';
import { SiteShell } from '../_components/site-shell';

export const metadata: Metadata = { title: 'Not covered by your role' };

export default function Forbidden() {
  return (
    <SiteShell>
      <RoleShort />
    </SiteShell>
  );
}
