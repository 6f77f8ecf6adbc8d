import type { Metadata } from 'next';
import { RoleShort } from '../_components/role-short';

export const metadata: Metadata = { title: 'Not covered by your role' };

// The shell round it is the layout's.
export default function Forbidden() {
  return (
    <main id="main" tabIndex={-1} className="mx-auto max-w-page px-4 pt-8 outline-none sm:px-6">
      <RoleShort />
    </main>
  );
}
