import type { CSSProperties } from 'react';
import { ScrollRegion } from '@/components/ui/scroll-region';
import { sayShortDay } from '@/lib/domain/shared/say-date';
import type { Grid, GridRow } from '@/lib/domain/timetable/build-grid';
import type { Clash } from '@/lib/domain/timetable/clash';
import type { Programme, ProgrammeMeeting, ProgrammeWorkshop } from '@/lib/domain/timetable/programme';
import { GridCellView } from './grid-cell';
import { PRINT_ON_ONE_SHEET } from './print-sheet';
import { sheetType } from './sheet-type';
import type { View } from './view';

export type GridProps = {
  programme: Programme;
  grid: Grid;
  clashes: readonly Clash[];
  view: View;
  /** The one day that a phone shows. */
  day: string;
  mayEdit: boolean;
  changeover: number;
  /** What is being placed or moved; free cells then say whether it fits. */
  workshop?: ProgrammeWorkshop;
  meeting?: ProgrammeMeeting;
};

/** Days across, time down, rooms as lanes of each time. */
export function GridTable(props: GridProps) {
  const { grid, programme, day } = props;
  return (
    <ScrollRegion
      label="Timetable grid"
      className="timetable-sheet border-t-2 border-ink lg:max-h-[88vh] print:max-h-none print:overflow-visible"
      style={{ '--sheet-type': `${sheetType(grid, programme)}pt` } as CSSProperties}
    >
      <style>{PRINT_ON_ONE_SHEET}</style>
      <h2 className="sr-only">Meetings</h2>
      <p className="hidden font-bold print:block">
        {programme.camp.name}: timetable ({programme.camp.timeZone})
      </p>
      <table className="w-full border-collapse text-left align-top text-small">
        <thead>
          <tr>
            <th scope="col" className="sticky top-0 z-20 w-20 bg-board px-2 py-2 print:static">
              Time
            </th>
            <th scope="col" className="sticky top-0 z-10 w-24 bg-board px-2 py-2 print:static">
              Room
            </th>
            {grid.days.map((one) => (
              <th
                key={one}
                scope="col"
                className={`sticky top-0 z-10 min-w-44 bg-board px-2 py-2 font-head text-base font-bold print:static print:table-cell print:min-w-0 ${one === day ? '' : 'max-lg:hidden'}`}
              >
                {sayShortDay(one)}
              </th>
            ))}
          </tr>
        </thead>
        {grid.rows.map((row) => (
          <Stretch key={row.starts} row={row} {...props} />
        ))}
      </table>
    </ScrollRegion>
  );
}

function Stretch({ row, ...props }: GridProps & { row: GridRow }) {
  return (
    <tbody className="border-t-2 border-ink">
      {row.lanes.map((lane, at) => (
        <tr
          key={lane.room.id}
          data-empty={lane.cells.every(({ meetings }) => meetings.length === 0)}
          className="border-t border-line"
        >
          {at === 0 && (
            <th
              scope="rowgroup"
              rowSpan={row.lanes.length}
              className="border-r border-line px-2 py-2 align-top font-semibold"
            >
              <span className="figures whitespace-nowrap">
                {row.starts}
                {row.ends && (
                  <>
                    –<br className="print:hidden" />
                    {row.ends}
                  </>
                )}
              </span>
              {row.label && <span className="block font-normal">{row.label}</span>}
            </th>
          )}
          <th scope="row" className="break-words border-r border-line px-2 py-2 align-top font-semibold">
            {lane.room.name}
          </th>
          {lane.cells.map((cell) => (
            <td
              key={cell.day}
              data-cell={JSON.stringify({ day: cell.day, starts: row.starts, roomId: lane.room.id })}
              className={`border-r border-line p-1 align-top data-[over=true]:bg-brass/30 print:table-cell ${cell.day === props.day ? '' : 'max-lg:hidden'}`}
            >
              <GridCellView cell={cell} row={row} room={lane.room} {...props} />
            </td>
          ))}
        </tr>
      ))}
    </tbody>
  );
}
