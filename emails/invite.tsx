import { LetterFrame } from './parts/letter-frame';
import { Para, PressLink } from './parts/letter-parts';

export type InviteProps = {
  organisationName: string;
  /** In words: "door crew". */
  role: string;
  invitedBy: string;
  url: string;
  days: number;
};

export const inviteSubject = ({ organisationName }: InviteProps): string =>
  `${organisationName} invites you to help with its camps`;

export function Invite({ organisationName, role, invitedBy, url, days }: InviteProps) {
  return (
    <LetterFrame
      preview={`${invitedBy} asks you to join as ${role}.`}
      title={`Help with the camps of ${organisationName}`}
      foot={`You get this because ${invitedBy} entered this address. If you do not know them, do nothing: without the link nothing is shared.`}
    >
      <Para>
        {invitedBy} invites you to {organisationName} as {role}. Accept with an account for this address; you
        can make one on the way.
      </Para>
      <PressLink href={url}>See the invitation</PressLink>
      <Para>The link works once, for {days} days.</Para>
    </LetterFrame>
  );
}
