import { checkHealth } from '@/lib/server/health/check-health';

/** For monitors. Not on the ladder of `route`, whose rungs need the very database that is asked about. */
function health(): Response {
  const trouble = checkHealth();
  return Response.json(trouble ? { status: 'unavailable', detail: trouble } : { status: 'ok' }, {
    status: trouble ? 503 : 200,
    headers: { 'cache-control': 'no-store' },
  });
}

export const GET = Object.assign(health, { access: { permission: 'public.read', on: null } });
