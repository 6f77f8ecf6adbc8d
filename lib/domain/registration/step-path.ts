import type { OrderId } from '../shared/ids';
import type { AnswerStep } from './steps';

/** Addresses of the steps; `from=check` on one brings the person back to the answers afterwards. */
export const stepPath = (slug: string, step: AnswerStep | 'check', from?: 'check'): string =>
  `/camps/${slug}/register/${step}${from ? '?from=check' : ''}`;

export const payPath = (slug: string, orderId: OrderId): string =>
  `/camps/${slug}/register/pay?order=${orderId}`;

export const paidPath = (orderId: OrderId): string => `/my/orders/${orderId}/paid`;
