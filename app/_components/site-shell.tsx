import type { ReactNode } from 'react';
import { SiteFoot } from '@/components/ui/site-foot';
import { SiteHead } from '@/components/ui/site-head';
import { getActor } from '@/lib/server/auth/get-actor';
import { signOutAction } from '../(account)/sign-out/actions';

// The real action's ladder runs inside; a bare form takes a function of its fields alone.
async function signOut(form: FormData): Promise<void> {
  'use server';
  await signOutAction(null, form);
}

/**
 * Head, main and foot round a page; the pages inside bring no `main` of their own. `work` pages take the whole width
 * and do bring one, beside their rail.
 */
export async function SiteShell({ children, work = false }: { children: ReactNode; work?: boolean }) {
  return (
    <>
      <SiteHead actor={await getActor()} wide={work} signOut={signOut} />
      {work ? (
        children
      ) : (
        <main id="main" tabIndex={-1} className="mx-auto max-w-page px-4 pt-8 outline-none sm:px-6 sm:pt-12">
          {children}
        </main>
      )}
      <SiteFoot wide={work} />
    </>
  );
}
