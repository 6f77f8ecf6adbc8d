import type { ReactNode } from 'react';
import { SiteShell } from '../_components/site-shell';

export default function OrganiserLayout({ children }: { children: ReactNode }) {
  return <SiteShell work>{children}</SiteShell>;
}
