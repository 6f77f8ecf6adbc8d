import 'server-only';
import { eq } from 'drizzle-orm';
import { camp } from '@/db/schema/camp';
import { suggestSlug } from '@/lib/domain/camp/suggest-slug';
import type { CampId } from '@/lib/domain/shared/ids';
import type { Tx } from '../db';

/** A web name that no other camp has: of the name, with the year, with a piece of the id. */
export function freeSlug(tx: Tx, name: string, startsOn: string, id: CampId): string {
  const plain = suggestSlug(name, 'camp');
  const year = startsOn.slice(0, 4);
  const dated = plain.endsWith(year) ? plain : `${plain}-${year}`;
  const wishes = [plain, dated, `${dated}-${id.slice(-5)}`];
  const taken = (slug: string) =>
    tx.select({ id: camp.id }).from(camp).where(eq(camp.slug, slug)).get() !== undefined;
  return wishes.find((slug) => !taken(slug)) ?? id.replace('_', '-');
}
