'use client';

import { useSyncExternalStore } from 'react';
import { Button } from '@/components/ui/button';

const never = () => () => {};

/** Only where a script can print: without one the browser's own menu does it. */
export function PrintButton() {
  const scripted = useSyncExternalStore(
    never,
    () => true,
    () => false,
  );
  return scripted ? <Button onClick={() => window.print()}>Print</Button> : null;
}
