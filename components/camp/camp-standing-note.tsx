import type { Route } from 'next';
import type { CampStanding } from '@/lib/domain/camp/camp-standing';
import { ButtonLink } from '../ui/button';
import { StateMark } from '../ui/state-mark';

type CampStandingNoteProps = {
  standing: CampStanding;
  registerHref: string;
  /** Who to write to. */
  email: string;
};

/** The one thing a visitor can do now, or why there is nothing to do. */
export function CampStandingNote({ standing, registerHref, email }: CampStandingNoteProps) {
  if (standing === 'open')
    return (
      <ButtonLink href={registerHref as Route} tone="primary" className="w-full text-lead">
        Register
      </ButtonLink>
    );
  const { mark, says } = NOTES[standing];
  return (
    <div>
      {mark && <p>{mark}</p>}
      <p className="mt-1 text-small text-soft">
        {says}
        {standing === 'full' && (
          <>
            {' '}
            To be told, write to <a href={`mailto:${email}`}>{email}</a>.
          </>
        )}
      </p>
    </div>
  );
}

const NOTES = {
  full: {
    // The strip above says "Full" already.
    mark: null,
    says: 'Every place is taken or kept for someone who is paying. One may come back: the strip shows it. Then load this page again to register.',
  },
  closed: {
    mark: <StateMark tone="off">Registration is closed</StateMark>,
    says: 'The organiser takes no more registrations for this camp.',
  },
  begun: {
    mark: <StateMark tone="wait">The camp is running</StateMark>,
    says: 'It has begun, so registration is over. The programme stays here.',
  },
  past: {
    mark: <StateMark tone="off">Past</StateMark>,
    says: 'This camp is over. Its programme stays here to look back at.',
  },
  draft: {
    mark: <StateMark tone="open">Draft</StateMark>,
    says: 'Only your organisation sees this page. The register button appears once the camp is published.',
  },
};
