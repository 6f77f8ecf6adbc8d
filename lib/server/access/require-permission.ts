import 'server-only';
import type { Route } from 'next';
import { headers } from 'next/headers';
import { forbidden, notFound, redirect } from 'next/navigation';
import type { Actor } from '@/lib/domain/access/actor';
import type { Permission } from '@/lib/domain/access/permissions';
import { getActor } from '../auth/get-actor';
import { refusalFor } from './authorise';
import type { TargetKind } from './find-target';

/** For pages: the actor when the permission holds; else to the sign-in page and back, 403 or 404. */
export async function requirePermission(
  permission: Permission,
  on?: { kind: TargetKind; id: string },
): Promise<Actor> {
  const actor = await getActor();
  const refusal = refusalFor(actor, permission, on);
  if (!refusal) return actor;
  if (refusal.code === 'sign_in_first') {
    const path = (await headers()).get('x-combwood-path') ?? '/';
    redirect(`/sign-in?next=${encodeURIComponent(path)}` as Route);
  }
  if (refusal.code === 'not_allowed') forbidden();
  notFound();
}
