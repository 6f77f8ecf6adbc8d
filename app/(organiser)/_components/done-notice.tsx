import { Notice } from '@/components/ui/notice';

/** What an action says on the page it leads to. Only these words: an address can name one, not write one. */
const WORDS = {
  saved: 'Saved.',
  added: 'Added.',
  'kept-length':
    'Saved. Meetings that are in the timetable keep the length they were placed with; the list says which differ. To change one, take it out there and place it again.',
  deleted: 'Deleted.',
  made: 'The draft is made. The list below says what is still missing.',
  published: 'The camp is on sale. Its page is public.',
  closed: 'The sale is closed. The page stays, with nothing to buy.',
  copied: 'This is the copy, a draft. People, orders and money stayed behind. Check dates and prices.',
} as const;

export type Done = keyof typeof WORDS;

export function DoneNotice({ done }: { done: string | string[] | undefined }) {
  const words = Object.entries(WORDS).find(([code]) => code === done)?.[1];
  return words ? (
    <Notice tone="done" live>
      <p className="font-semibold text-moss">{words}</p>
    </Notice>
  ) : null;
}
