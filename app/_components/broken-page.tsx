import { Button } from '@/components/ui/button';
import { DeadEnd } from '@/components/ui/dead-end';

/** Never the error's own message: its reference, which the log has too. */
export function BrokenPage({ reference, again }: { reference?: string; again: () => void }) {
  return (
    <DeadEnd title="Something went wrong on our side" beside={<Button onClick={again}>Try again</Button>}>
      <p>Nothing that you sent was lost. Try again; if it stays, write to the organiser of your camp.</p>
      {reference && (
        <p className="text-base text-soft">
          Reference <span className="figures">{reference}</span>
        </p>
      )}
    </DeadEnd>
  );
}
