import {
  columnVisibilityFeature,
  createColumnHelper,
  rowSortingFeature,
  tableFeatures,
  useTable,
} from '@tanstack/react-table';
import type { ReactNode } from 'react';
import { ScrollRegion } from '@/components/ui/scroll-region';
import type { PeopleQuery } from '@/lib/domain/people/people-query';
import type { PeoplePage, PeopleRow } from '@/lib/domain/people/people-row';
import { ColumnChooser } from './column-chooser';
import { PEOPLE_COLUMNS, type PeopleColumn } from './people-columns';
import { SortHead } from './sort-head';
import { useColumnChoice } from './use-column-choice';
import type { ChangeQuery } from './use-people-query';

const features = tableFeatures({ columnVisibilityFeature, rowSortingFeature });
const helper = createColumnHelper<typeof features, PeopleRow>();
const columns = helper.columns(PEOPLE_COLUMNS.map(({ id, head }) => helper.display({ id, header: head })));

type PeopleTableProps = {
  campId: string;
  timeZone: string;
  page: PeoplePage;
  query: PeopleQuery;
  change: ChangeQuery;
  onOpen: (registrationId: string) => void;
  busy: boolean;
};

/** Search, order and pages are the server's; the table keeps the columns and draws. */
export function PeopleTable({ campId, timeZone, page, query, change, onOpen, busy }: PeopleTableProps) {
  const [columnVisibility, setColumnVisibility] = useColumnChoice();
  const table = useTable({
    features,
    columns,
    data: page.rows,
    getRowId: (row) => row.id,
    manualSorting: true,
    state: { columnVisibility, sorting: [{ id: query.sort, desc: query.dir === 'desc' }] },
    onColumnVisibilityChange: setColumnVisibility,
  });
  const spec = (id: string): PeopleColumn | undefined => PEOPLE_COLUMNS.find((column) => column.id === id);
  const cell = (id: string, row: PeopleRow): ReactNode => spec(id)?.cell(row, { campId, timeZone, onOpen });
  // On a phone the name carries the rest; columns that stay are few.
  const onPhone = (id: string) => (spec(id)?.phone ? '' : 'max-md:hidden');
  return (
    <>
      <ColumnChooser
        columns={table
          .getAllLeafColumns()
          .filter((column) => column.id !== 'name')
          .map((column) => ({
            id: column.id,
            word: spec(column.id)?.head ?? column.id,
            shown: column.getIsVisible(),
            toggle: () => column.toggleVisibility(),
          }))}
      />
      <ScrollRegion label="People" className="max-h-[80vh] border-t-2 border-ink">
        <table className="w-full border-collapse text-left" aria-busy={busy}>
          <thead>
            {table.getHeaderGroups().map((group) => (
              <tr key={group.id}>
                {group.headers.map((header) => (
                  <SortHead
                    key={header.id}
                    column={spec(header.column.id)}
                    campId={campId}
                    query={query}
                    change={change}
                    className={onPhone(header.column.id)}
                  />
                ))}
              </tr>
            ))}
          </thead>
          <tbody>
            {table.getRowModel().rows.map((row) => (
              <tr key={row.id} className="border-t border-line hover:bg-panel">
                {row.getVisibleCells().map((one) => {
                  const Tag = one.column.id === 'name' ? 'th' : 'td';
                  return (
                    <Tag
                      key={one.id}
                      scope={Tag === 'th' ? 'row' : undefined}
                      className={`px-1 py-1.5 text-left align-top md:px-2 font-normal ${onPhone(one.column.id)} ${spec(one.column.id)?.end ? 'text-right' : ''}`}
                    >
                      {cell(one.column.id, row.original)}
                    </Tag>
                  );
                })}
              </tr>
            ))}
          </tbody>
        </table>
      </ScrollRegion>
    </>
  );
}
