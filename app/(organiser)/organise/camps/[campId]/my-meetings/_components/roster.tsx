import { HarpName } from '@/components/harp/harp-name';
import { ScrollRegion } from '@/components/ui/scroll-region';
import { StateMark } from '@/components/ui/state-mark';
import { isAnyKey } from '@/lib/domain/harp/harp-ask';
import { harpFromAsk } from '@/lib/domain/harp/harp-from-ask';
import { harpLabel } from '@/lib/domain/harp/harp-label';
import type { TaughtMeeting } from '@/lib/domain/roster/taught-meeting';
import { listWords } from '@/lib/domain/shared/list-words';

/** Who comes, of which track, and who lacks a harp that is asked for. */
export function Roster({ meeting: { players, needs, title } }: { meeting: TaughtMeeting }) {
  const named = needs
    .filter((need) => !isAnyKey(need))
    .map((need) => ({
      words: listWords([...new Set(need.anyOf.map((ask) => harpLabel(harpFromAsk(ask))))], 'or'),
      helpful: need.level === 'helpful',
    }));
  return (
    <ScrollRegion label={`Players of ${title}`} className="max-h-[70vh]">
      <table className="w-full border-collapse text-left">
        <thead>
          <tr className="border-b border-edge">
            <th scope="col" className="py-1 pr-4">
              Name
            </th>
            <th scope="col" className="py-1 pr-4">
              Track
            </th>
            {named.map(({ words, helpful }) => (
              <th key={`${words} ${helpful}`} scope="col" className="py-1 pr-4">
                <HarpName>{words}</HarpName>
                {helpful && <span className="block text-small font-normal text-soft">helpful</span>}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {players.map((player) => (
            <tr key={player.id} className="border-b border-line">
              <th scope="row" className="break-words py-1.5 pr-4 font-semibold">
                {player.name}
              </th>
              <td className="py-1.5 pr-4">{player.track}</td>
              {named.map(({ words, helpful }, at) => (
                <td key={`${words} ${helpful}`} className="py-1.5 pr-4">
                  <StateMark tone={player.has[at] ? 'done' : helpful ? 'off' : 'stop'}>
                    {player.has[at] ? 'Owns' : 'Lacks'}
                  </StateMark>
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </ScrollRegion>
  );
}
