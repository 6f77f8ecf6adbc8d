'use client';

import { useEffect, useRef } from 'react';
import { ActionButton } from '@/components/forms/action-button';
import type { OrderedList } from '@/lib/server/camps/own-rows';
import { moveRowAction } from '../organise/camps/[campId]/actions';

type MoveButtonsProps = {
  campId: string;
  list: OrderedList;
  id: string;
  name: string;
  first: boolean;
  last: boolean;
};

/** Up and down by one: order by keyboard, touch and without a script alike. */
export function MoveButtons({ campId, list, id, name, first, last }: MoveButtonsProps) {
  const box = useRef<HTMLFieldSetElement>(null);
  const pressed = useRef(false);
  // At an end of the list the pressed button goes away, and the focus with it: the other one takes it.
  useEffect(() => {
    if (!pressed.current || !(first || last)) return;
    pressed.current = false;
    if (document.activeElement === document.body) box.current?.querySelector('button')?.focus();
  }, [first, last]);
  const button = (towards: 'up' | 'down', edge: boolean) =>
    edge ? (
      <span className="w-11" />
    ) : (
      <ActionButton
        action={moveRowAction}
        hidden={{ campId, list, id, towards }}
        label={`Move ${name} ${towards}`}
        className="w-11 px-0"
      >
        <span aria-hidden="true">{towards === 'up' ? '↑' : '↓'}</span>
      </ActionButton>
    );
  return (
    <fieldset
      ref={box}
      aria-label={`Order of ${name}`}
      className="flex gap-2"
      onSubmit={() => {
        pressed.current = true;
      }}
    >
      {button('up', first)}
      {button('down', last)}
    </fieldset>
  );
}
