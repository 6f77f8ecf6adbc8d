import { badRequest } from './api-error';
import type { Mock } from './mock';

type Plain = Record<string, unknown>;

// Fields that hold an id, and where its object is kept.
const links = {
  payment_intent: 'intent',
  latest_charge: 'charge',
  charge: 'charge',
  balance_transaction: 'balance',
  failure_balance_transaction: 'balance',
} as const;

function list(data: object[], url: string) {
  return { object: 'list', data, has_more: false, url };
}

function fetchField(mock: Mock, owner: Plain, field: string): unknown {
  if (owner.object === 'checkout.session' && field === 'line_items')
    return list(
      mock.store.get('session', String(owner.id))?.lineItems ?? [],
      `/v1/checkout/sessions/${owner.id}/line_items`,
    );
  if (owner.object === 'charge' && field === 'refunds') {
    const refunds = mock.store.all('refund').filter((refund) => refund.charge === owner.id);
    return list(refunds.reverse(), `/v1/charges/${owner.id}/refunds`);
  }
  if (!(field in owner) || !(field in links)) return undefined;
  const id = owner[field];
  if (id === null || typeof id !== 'string') return id;
  return mock.store.get(links[field as keyof typeof links], id) ?? id;
}

function expandPath(mock: Mock, owner: unknown, path: string[], whole: string): unknown {
  const [field, ...rest] = path;
  if (field === undefined || owner === null) return owner;
  if (Array.isArray(owner)) return owner.map((item) => expandPath(mock, item, path, whole));
  if (typeof owner !== 'object')
    throw badRequest(`This property cannot be expanded (${whole}).`, { param: 'expand' });
  const plain = owner as Plain;
  const isList = plain.object === 'list' && field === 'data';
  const value = isList ? plain.data : fetchField(mock, plain, field);
  if (value === undefined)
    throw badRequest(`This property cannot be expanded (${whole}).`, { param: 'expand' });
  return { ...plain, [field]: expandPath(mock, value, rest, whole) };
}

/** Puts related objects in the place of their ids, as `expand` asks: `payment_intent.latest_charge`, `data.charge`. */
export function expandObject(mock: Mock, object: object, paths: readonly string[] = []): object {
  return paths.reduce<object>((soFar, whole) => {
    const path = whole.split('.');
    if (path.length > 4)
      throw badRequest('You cannot expand more than 4 levels of a property.', { param: 'expand' });
    return expandPath(mock, soFar, path, whole) as object;
  }, object);
}
