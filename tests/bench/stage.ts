import type { RegistrationId } from '@/lib/domain/shared/ids';

/** What is up while the answers over HTTP are measured. */
export type Stage = {
  app: string;
  bare: string;
  /** The database file that the application runs on. */
  file: string;
  /** Of somebody who runs the large camp and works its door. */
  cookie: string;
  /** Tickets of the large camp, each of another person who has not arrived. */
  codes: string[];
  registrationId: RegistrationId;
};

export const LARGE_CAMP = 'cmp_1';
