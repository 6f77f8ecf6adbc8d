import 'server-only';
import { isId } from '@/lib/domain/shared/ids';
import { loadOrder, type OrderView } from '../../orders/load-order';

export function requireOrder(id: string): OrderView {
  const view = isId('ord', id) ? loadOrder(id) : null;
  if (!view) throw new Error('There is no such order');
  return view;
}
