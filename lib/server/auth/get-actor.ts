import 'server-only';
import { cache } from 'react';
import { type Actor, VISITOR } from '@/lib/domain/access/actor';

/** Who is asking, once a request. */
export const getActor = cache(async (): Promise<Actor> => VISITOR);
