import { StripHoles } from '@/components/harp/strip-holes';
import { buttonClass } from '@/components/ui/button-class';

// One reed missing, as in DeadEnd.
const LOOKS = [
  'filled',
  'filled',
  'filled',
  'open',
  'filled',
  'filled',
  'filled',
  'filled',
  'filled',
  'filled',
] as const;

/**
 * Never the error's own message: its reference, which the log has too. Sent along with every page, so it is built of
 * little and leads on by a plain link.
 */
export function BrokenPage({ reference, again }: { reference?: string; again: () => void }) {
  return (
    <main id="main" className="mx-auto max-w-page px-4 py-14 sm:px-6">
      <StripHoles looks={LOOKS} className="max-w-64" />
      <h1 className="mt-6">Something went wrong on our side</h1>
      <p className="mt-4 max-w-prose text-lead">
        Nothing that you sent was lost. Try again; if it stays, write to the organiser of your camp.
      </p>
      {reference && (
        <p className="mt-3 text-soft">
          Reference <span className="figures">{reference}</span>
        </p>
      )}
      <p className="mt-8 flex flex-wrap gap-4">
        <button type="button" onClick={again} className={buttonClass('plain')}>
          Try again
        </button>
        <a href="/" className={buttonClass('plain')}>
          See all camps
        </a>
      </p>
    </main>
  );
}
