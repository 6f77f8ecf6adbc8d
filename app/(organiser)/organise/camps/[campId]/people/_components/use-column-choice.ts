import type { ColumnVisibilityState, Updater } from '@tanstack/react-table';
import { useCallback, useEffect, useState } from 'react';
import { PEOPLE_COLUMNS } from './people-columns';

const KEY = 'combwood.people.columns';
const USUAL: ColumnVisibilityState = Object.fromEntries(PEOPLE_COLUMNS.map(({ id, usual }) => [id, usual]));

/** Which columns are shown, kept in this browser. The server draws the usual ones, so the kept choice comes after. */
export function useColumnChoice(): [ColumnVisibilityState, (update: Updater<ColumnVisibilityState>) => void] {
  const [choice, setChoice] = useState(USUAL);
  useEffect(() => {
    setChoice(readKept());
  }, []);
  const change = useCallback((update: Updater<ColumnVisibilityState>) => {
    setChoice((before) => {
      const after = typeof update === 'function' ? update(before) : update;
      keep(after);
      return after;
    });
  }, []);
  return [choice, change];
}

function readKept(): ColumnVisibilityState {
  try {
    const kept: unknown = JSON.parse(window.localStorage.getItem(KEY) ?? '{}');
    if (typeof kept !== 'object' || kept === null) return USUAL;
    const known = Object.entries(kept).filter(([id, shown]) => id in USUAL && typeof shown === 'boolean');
    return { ...USUAL, ...Object.fromEntries(known) };
  } catch {
    return USUAL;
  }
}

function keep(choice: ColumnVisibilityState): void {
  try {
    window.localStorage.setItem(KEY, JSON.stringify(choice));
  } catch {
    // Storage may be full or forbidden: the choice then lasts as long as the page.
  }
}
