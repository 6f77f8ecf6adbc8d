import { HarpName } from '@/components/harp/harp-name';
import { compareHarps } from '@/lib/domain/harp/compare-harps';
import { type HarpNeed, isAnyKey } from '@/lib/domain/harp/harp-ask';
import { harpFromAsk } from '@/lib/domain/harp/harp-from-ask';
import { harpId } from '@/lib/domain/harp/harp-id';
import { harpLabel } from '@/lib/domain/harp/harp-label';
import { listWords } from '@/lib/domain/shared/list-words';

/** The harps of a workshop in the width of a lane: one tag a need, "A or D" where either will do, lowest first. */
export function CardHarps({ needs, title }: { needs: readonly HarpNeed[]; title: string }) {
  const tags = needs
    .filter((need) => !isAnyKey(need))
    .map((need) => {
      const harps = [
        ...new Map(need.anyOf.map(harpFromAsk).map((harp) => [harpId(harp), harp])).values(),
      ].sort(compareHarps);
      const words = `${listWords(harps.map(harpLabel), 'or')}${need.level === 'helpful' ? ' (helpful)' : ''}`;
      return { words, harp: harps[0] };
    })
    .sort((a, b) => (a.harp && b.harp ? compareHarps(a.harp, b.harp) : 0));
  const each = [...new Set(tags.map(({ words }) => words))];
  if (each.length === 0) return null;
  return (
    <ul aria-label={`Harps for ${title}`} className="flex flex-wrap gap-1">
      {each.map((words) => (
        <li key={words} className="rounded border border-edge bg-board px-1.5 font-semibold">
          <HarpName>{words}</HarpName>
        </li>
      ))}
    </ul>
  );
}
