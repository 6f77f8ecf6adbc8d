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
  const button = (towards: 'up' | 'down', edge: boolean) =>
    edge ? (
      <span className="min-w-target" />
    ) : (
      <ActionButton
        action={moveRowAction}
        hidden={{ campId, list, id, towards }}
        label={`Move ${name} ${towards}`}
        tone="quiet"
        className="min-w-target no-underline"
      >
        <span aria-hidden="true">{towards === 'up' ? '↑' : '↓'}</span>
      </ActionButton>
    );
  return (
    <div className="flex">
      {button('up', first)}
      {button('down', last)}
    </div>
  );
}
