import 'server-only';
import { isId } from '@/lib/domain/shared/ids';
import { env } from '../env';
import { grantOrder } from './grant-order';
import { isOrderProof } from './order-grants';

/**
 * Answers a mail's link: a right key becomes this browser's cookie, and the address it leads to carries no key, so that
 * none is left in the history, in a referrer or over somebody's shoulder. A wrong one leads to where a new link is asked.
 */
export async function takeGrant(id: string, key: string, path: string): Promise<Response> {
  const right = (isId('ord', id) || isId('reg', id)) && isOrderProof(id, key);
  if (right) await grantOrder(id);
  return new Response(null, {
    status: 303,
    headers: {
      location: `${env().BASE_URL}${right ? path : '/my?link=broken'}`,
      'referrer-policy': 'no-referrer',
      'cache-control': 'no-store',
      'x-robots-tag': 'noindex',
    },
  });
}
