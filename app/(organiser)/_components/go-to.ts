import type { Route } from 'next';
import { redirect } from 'next/navigation';
import type { CampId } from '@/lib/domain/shared/ids';
import type { Done } from './done-notice';

/** After an action: to a page of the camp, which says what was done. */
export const goToCamp = (campId: CampId, page: '' | `/${string}`, done: Done): never =>
  redirect(`/organise/camps/${campId}${page}?done=${done}` as Route);
