import type { RegistrationState } from '../registration/states';
import type { OrderId } from '../shared/ids';
import type { Minor } from '../shared/money';

/** Sums of a camp's books in minor units of its currency. */
export type MoneyTotals = {
  orders: number;
  /** Places sold. */
  sold: Minor;
  /** Money that came in. */
  paid: Minor;
  /** Money that went back. */
  refunded: Minor;
  /** Still to come, and on how many orders. */
  owed: Minor;
  owing: number;
  /** To be given back, and on how many orders. */
  back: Minor;
  backing: number;
};

export type MoneyOrder = {
  id: OrderId;
  reference: string;
  payer: string;
  state: RegistrationState;
  total: Minor;
  paid: Minor;
  due: Minor;
  currency: string;
  createdAt: number;
};

/** Something that a program must not decide alone. */
export type MoneyQuestion = {
  id: string;
  at: number;
  what: string;
  why: string;
  reference: string | null;
  amount: { amount: Minor; currency: string } | null;
};

export type LedgerLine = {
  id: string;
  posting: string;
  at: number;
  account: 'provider' | 'payers' | 'income';
  memo: string;
  reference: string;
  amount: Minor;
  currency: string;
};
