'use client';

import { type ReactNode, startTransition, useActionState, useEffect, useRef } from 'react';
import { Notice } from '@/components/ui/notice';
import { moveMeetingAction, placeMeetingAction } from '../actions';
import { listenForDrag } from './listen-for-drag';

type DragLayerProps = { campId: string; view: string; enabled: boolean; children: ReactNode };

/**
 * Dragging as an extra: a card, or a workshop that waits, onto a cell. It sends the same forms as the panel does, which
 * stays the way by keyboard and without JavaScript.
 */
export function DragLayer({ campId, view, enabled, children }: DragLayerProps) {
  const [moved, move, moving] = useActionState(moveMeetingAction, null);
  const [placed, place, placing] = useActionState(placeMeetingAction, null);
  const layer = useRef<HTMLDivElement>(null);
  const state = moved?.status === 'error' ? moved : placed;
  const said =
    state?.status === 'error' ? Object.values(state.error ?? {}).flatMap((some) => some ?? []) : [];

  useEffect(() => {
    if (!enabled || !layer.current) return;
    return listenForDrag(layer.current, (dragged, cell) => {
      const form = new FormData();
      const { starts = '', ...where } = cell;
      const values = { campId, view, block: starts, ...where, ...dragged };
      for (const [name, value] of Object.entries(values)) form.set(name, value ?? '');
      startTransition(() => ('meetingId' in dragged ? move(form) : place(form)));
    });
  }, [enabled, campId, view, move, place]);

  return (
    <div ref={layer} aria-busy={moving || placing}>
      {said.length > 0 && (
        <Notice tone="stop" title="It stays where it was" live>
          {said.join(' ')}
        </Notice>
      )}
      {children}
    </div>
  );
}
