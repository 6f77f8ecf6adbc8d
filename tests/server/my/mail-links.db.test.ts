import { beforeEach, describe, expect, test, vi } from 'vitest';
import { GET as openOrder } from '@/app/o/[orderId]/route';
import { GET as openRegistration } from '@/app/r/[registrationId]/route';
import { orderProof, ordersCookieName } from '@/lib/server/auth/order-grants';
import { readActor } from '@/lib/server/auth/read-actor';
import { fakeRequest, useFakeRequest } from '@/tests/setup/fake-request';
import { useTestDatabase } from '@/tests/setup/test-database';

vi.mock('next/headers', async () => (await import('@/tests/setup/fake-request')).nextHeaders);

useTestDatabase();
useFakeRequest();
beforeEach(() => fakeRequest.headers.delete('origin'));

const order = (id: string, key: string) =>
  openOrder(new Request(`http://localhost:3000/o/${id}?key=${encodeURIComponent(key)}`), {
    params: Promise.resolve({ orderId: id }),
  });
const registration = (id: string, key: string) =>
  openRegistration(new Request(`http://localhost:3000/r/${id}?key=${encodeURIComponent(key)}`), {
    params: Promise.resolve({ registrationId: id }),
  });
const granted = () => readActor({ session: undefined, orders: fakeRequest.jar.get(ordersCookieName()) }, 0);

describe('a link of a mail', () => {
  test('becomes a cookie that scripts and other sites cannot use, and leads on without its key', async () => {
    const key = orderProof('ord_1');
    const answer = await order('ord_1', key);
    expect(answer.status).toBe(303);
    expect(answer.headers.get('location')).toBe('http://localhost:3000/my/orders/ord_1');
    // ASVS 14.2.1: the key is in no address that stays, and no referrer.
    expect(answer.headers.get('location')).not.toContain(key);
    expect(answer.headers.get('referrer-policy')).toBe('no-referrer');
    expect(answer.headers.get('cache-control')).toBe('no-store');
    expect(fakeRequest.written[0]?.flags).toMatchObject({ httpOnly: true, sameSite: 'lax', path: '/' });
    expect(await granted()).toMatchObject({ user: null, orders: ['ord_1'], registrations: [] });
  });

  test('of an attendee grants their registration, never the order', async () => {
    const answer = await registration('reg_1a', orderProof('reg_1a'));
    expect(answer.headers.get('location')).toBe('http://localhost:3000/my/registrations/reg_1a/packing-list');
    expect(await granted()).toMatchObject({ orders: [], registrations: ['reg_1a'] });
  });

  test('keeps what was granted before, newest first, up to twelve', async () => {
    for (let count = 0; count < 15; count += 1) await order(`ord_${count}`, orderProof(`ord_${count}`));
    await registration('reg_1a', orderProof('reg_1a'));
    const { orders, registrations } = await granted();
    expect([...orders, ...registrations]).toHaveLength(12);
    expect(orders[0]).toBe('ord_14');
  });

  test.each([
    ['the key of another order', 'ord_1', orderProof('ord_2')],
    ['the key of a registration of the same name', 'ord_1', orderProof('reg_1')],
    ['a cut key', 'ord_1', orderProof('ord_1').slice(0, -1)],
    ['no key', 'ord_1', ''],
    ['an endless key', 'ord_1', 'x'.repeat(5000)],
    ['an id that is none', '../../etc', 'x'],
    ['a foreign kind of id', 'usr_1', orderProof('ord_1')],
  ])('with %s grants nothing and leads to where a new one is asked', async (_, id, key) => {
    const answer = await order(id, key);
    expect(answer.status).toBe(303);
    expect(answer.headers.get('location')).toBe('http://localhost:3000/my?link=broken');
    expect(fakeRequest.written).toEqual([]);
  });

  test('a cookie that somebody wrote by hand proves nothing', async () => {
    const forged = `ord_1.${orderProof('ord_2')} ord_2.x reg_1a.${orderProof('ord_1')} junk . ..`;
    expect(await readActor({ session: undefined, orders: forged }, 0)).toMatchObject({
      orders: [],
      registrations: [],
    });
  });
});
