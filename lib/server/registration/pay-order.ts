import 'server-only';
import type { OrderId } from '@/lib/domain/shared/ids';
import type { Result } from '@/lib/domain/shared/result';
import { type Refusal, refuse } from '../errors';
import { type PayStart, startPayment } from './start-payment';

/** The Pay button: where to go, or why not. */
export async function payOrder(orderId: OrderId, now: number): Promise<Result<PayStart, Refusal>> {
  const start = await startPayment(orderId, now);
  return start.ok ? start : refuse(start.error);
}
