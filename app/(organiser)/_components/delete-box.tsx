import { ActionButton } from '@/components/forms/action-button';
import { Disclose } from '@/components/ui/disclose';

type DeleteBoxProps = {
  /** "this track". */
  what: string;
  action: Parameters<typeof ActionButton>[0]['action'];
  hidden: Record<string, string>;
  children?: string;
};

/** Deleting takes two presses, the second beside what it means. */
export function DeleteBox({ what, action, hidden, children }: DeleteBoxProps) {
  return (
    <Disclose summary={`Delete ${what}`} danger>
      <p>
        {children ?? 'It is gone for good. If anything still uses it, nothing happens and you are told what.'}
      </p>
      <ActionButton action={action} hidden={hidden} tone="danger">
        Delete for good
      </ActionButton>
    </Disclose>
  );
}
